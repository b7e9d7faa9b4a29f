import type { Metadata } from "next";
import { marks, marksOperation } from "@/calculators/marks";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { MarksCalculator } from "@/components/calculators/marks/marks-calculator";
import { prepareMarks } from "@/components/calculators/marks/marks-fields";
import { MarksShowMe } from "@/components/calculators/marks/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "marks"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function MarksAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(marksOperation, await searchParams, prepareMarks);
  return (
    <CalculatorPage locale={locale} calculator={marks} showMeDrawing={<MarksShowMe />}>
      {(header) => <MarksCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
