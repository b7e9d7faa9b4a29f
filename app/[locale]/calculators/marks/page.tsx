import type { Metadata } from "next";
import { marks } from "@/calculators/marks";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { MarksCalculator } from "@/components/calculators/marks/marks-calculator";
import { MarksShowMe } from "@/components/calculators/marks/show-me-drawing";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return calculatorMetadata((await params).locale, "marks");
}

export default async function MarksPage({ params }: PageProps) {
  const { locale } = await params;
  return (
    <CalculatorPage locale={locale} calculator={marks} showMeDrawing={<MarksShowMe />}>
      {(header) => <MarksCalculator header={header} />}
    </CalculatorPage>
  );
}
