import type { Metadata } from "next";
import { corner, cornerOperation } from "@/calculators/corner";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { CornerCalculator } from "@/components/calculators/corner/corner-calculator";
import { withBurn } from "@/components/calculators/burn-field";
import { CornerShowMe } from "@/components/calculators/corner/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "corner"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function CornerAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(cornerOperation, await searchParams, withBurn);
  return (
    <CalculatorPage locale={locale} calculator={corner} showMeDrawing={<CornerShowMe />}>
      {(header) => <CornerCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
