import type { Metadata } from "next";
import { squareness, squarenessOperation } from "@/calculators/squareness";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { SquarenessCalculator } from "@/components/calculators/squareness/squareness-calculator";
import { prepareSquareness } from "@/components/calculators/squareness/squareness-fields";
import { SquarenessShowMe } from "@/components/calculators/squareness/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "squareness"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function SquarenessAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(squarenessOperation, await searchParams, prepareSquareness);
  return (
    <CalculatorPage locale={locale} calculator={squareness} showMeDrawing={<SquarenessShowMe />}>
      {(header) => <SquarenessCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
