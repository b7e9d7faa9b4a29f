import type { Metadata } from "next";
import { anchors, checkOperation, layoutOperation } from "@/calculators/anchors";
import { AnchorsCalculator } from "@/components/calculators/anchors/anchors-calculator";
import { modeOf, prepareAnchors } from "@/components/calculators/anchors/anchors-fields";
import { AnchorsShowMe } from "@/components/calculators/anchors/show-me-drawing";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "anchors"), robots: { index: false } };
}

/** The answer to a form sent without script: a layout, or the check of what is in the concrete. */
export default async function AnchorsAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const query = await searchParams;
  const mode = modeOf({ mode: query.mode, pieces: query["pieces.0.to"] === undefined ? [] : [{}] });
  const initial = mode === "check" ? answerOnServer(checkOperation, query, prepareAnchors) : answerOnServer(layoutOperation, query, prepareAnchors);
  return (
    <CalculatorPage locale={locale} calculator={anchors} showMeDrawing={<AnchorsShowMe />}>
      {(header) => <AnchorsCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
