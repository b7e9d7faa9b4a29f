import type { Metadata } from "next";
import { takeoff } from "@/calculators/takeoff";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { TakeoffCalculator } from "@/components/calculators/takeoff/takeoff-calculator";
import { TakeoffShowMe } from "@/components/calculators/takeoff/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "takeoff");
}

export default async function TakeoffPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={takeoff} showMeDrawing={<TakeoffShowMe />}>
      {(header) => <TakeoffCalculator header={header} />}
    </CalculatorPage>
  );
}
