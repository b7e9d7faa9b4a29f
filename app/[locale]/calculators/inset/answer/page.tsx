import type { Metadata } from "next";
import { inset, insetOperation } from "@/calculators/inset";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { InsetCalculator } from "@/components/calculators/inset/inset-calculator";
import { prepareInset } from "@/components/calculators/inset/inset-fields";
import { InsetShowMe } from "@/components/calculators/inset/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "inset"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function InsetAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(insetOperation, await searchParams, prepareInset);
  return (
    <CalculatorPage locale={locale} calculator={inset} showMeDrawing={<InsetShowMe />}>
      {(header) => <InsetCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
