import type { Metadata } from "next";
import { squareness } from "@/calculators/squareness";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { SquarenessCalculator } from "@/components/calculators/squareness/squareness-calculator";
import { SquarenessShowMe } from "@/components/calculators/squareness/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "squareness");
}

export default async function SquarenessPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={squareness} showMeDrawing={<SquarenessShowMe />}>
      {(header) => <SquarenessCalculator header={header} />}
    </CalculatorPage>
  );
}
