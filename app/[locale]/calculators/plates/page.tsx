import type { Metadata } from "next";
import { plates } from "@/calculators/plates";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { PlatesCalculator } from "@/components/calculators/plates/plates-calculator";
import { PlatesShowMe } from "@/components/calculators/plates/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "plates");
}

export default async function PlatesPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={plates} showMeDrawing={<PlatesShowMe />}>
      {(header) => <PlatesCalculator header={header} />}
    </CalculatorPage>
  );
}
