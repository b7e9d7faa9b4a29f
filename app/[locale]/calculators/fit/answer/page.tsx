import type { Metadata } from "next";
import { fit, fitOperation } from "@/calculators/fit";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { FitCalculator } from "@/components/calculators/fit/fit-calculator";
import { prepareFit } from "@/components/calculators/fit/fit-fields";
import { FitShowMe } from "@/components/calculators/fit/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "fit"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function FitAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(fitOperation, await searchParams, prepareFit);
  return (
    <CalculatorPage locale={locale} calculator={fit} showMeDrawing={<FitShowMe />}>
      {(header) => <FitCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
