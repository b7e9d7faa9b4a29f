import type { Metadata } from "next";
import { anchors } from "@/calculators/anchors";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { AnchorsCalculator } from "@/components/calculators/anchors/anchors-calculator";
import { AnchorsShowMe } from "@/components/calculators/anchors/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "anchors");
}

export default async function AnchorsPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={anchors} showMeDrawing={<AnchorsShowMe />}>
      {(header) => <AnchorsCalculator header={header} />}
    </CalculatorPage>
  );
}
