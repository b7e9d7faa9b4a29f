import type { Metadata } from "next";
import { conversions, conversionsOperation } from "@/calculators/conversions";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { ConversionsCalculator } from "@/components/calculators/conversions/conversions-calculator";
import { InchDrawing } from "@/components/calculators/conversions/inch-drawing";
import { foldLines, withoutBlankEnd } from "@/components/calculators/conversions/strip-fields";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "conversions"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function ConversionsAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(conversionsOperation, foldLines(await searchParams), withoutBlankEnd);
  return (
    <CalculatorPage locale={locale} calculator={conversions} showMeDrawing={<InchDrawing t={getTranslate(locale, ["conversions"])} />}>
      {(header) => <ConversionsCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
