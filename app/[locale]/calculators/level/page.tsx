import type { Metadata } from "next";
import { level } from "@/calculators/level";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { LevelCalculator } from "@/components/calculators/level/level-calculator";
import { LevelShowMe } from "@/components/calculators/level/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "level");
}

export default async function LevelPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={level} showMeDrawing={<LevelShowMe />}>
      {(header) => <LevelCalculator header={header} />}
    </CalculatorPage>
  );
}
