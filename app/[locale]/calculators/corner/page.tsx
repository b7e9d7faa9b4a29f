import type { Metadata } from "next";
import { corner } from "@/calculators/corner";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { CornerCalculator } from "@/components/calculators/corner/corner-calculator";
import { CornerShowMe } from "@/components/calculators/corner/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "corner");
}

export default async function CornerPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={corner} showMeDrawing={<CornerShowMe />}>
      {(header) => <CornerCalculator header={header} />}
    </CalculatorPage>
  );
}
