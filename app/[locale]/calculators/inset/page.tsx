import type { Metadata } from "next";
import { inset } from "@/calculators/inset";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { InsetCalculator } from "@/components/calculators/inset/inset-calculator";
import { InsetShowMe } from "@/components/calculators/inset/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "inset");
}

export default async function InsetPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={inset} showMeDrawing={<InsetShowMe />}>
      {(header) => <InsetCalculator header={header} />}
    </CalculatorPage>
  );
}
