import type { Metadata } from "next";
import { fit } from "@/calculators/fit";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { FitCalculator } from "@/components/calculators/fit/fit-calculator";
import { FitShowMe } from "@/components/calculators/fit/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "fit");
}

export default async function FitPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={fit} showMeDrawing={<FitShowMe />}>
      {(header) => <FitCalculator header={header} />}
    </CalculatorPage>
  );
}
