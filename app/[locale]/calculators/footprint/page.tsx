import type { Metadata } from "next";
import { footprint } from "@/calculators/footprint";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { FootprintCalculator } from "@/components/calculators/footprint/footprint-calculator";
import { FootprintShowMe } from "@/components/calculators/footprint/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "footprint");
}

export default async function FootprintPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={footprint} showMeDrawing={<FootprintShowMe />}>
      {(header) => <FootprintCalculator header={header} />}
    </CalculatorPage>
  );
}
