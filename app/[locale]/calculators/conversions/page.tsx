import type { Metadata } from "next";
import { conversions } from "@/calculators/conversions";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { ConversionsCalculator } from "@/components/calculators/conversions/conversions-calculator";
import { InchDrawing } from "@/components/calculators/conversions/inch-drawing";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "conversions");
}

export default async function ConversionsPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={conversions} showMeDrawing={<InchDrawing t={getTranslate(locale, ["conversions"])} />}>
      {(header) => <ConversionsCalculator header={header} />}
    </CalculatorPage>
  );
}
