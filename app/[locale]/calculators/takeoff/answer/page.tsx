import type { Metadata } from "next";
import { takeoff, takeoffOperation } from "@/calculators/takeoff";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { TakeoffCalculator } from "@/components/calculators/takeoff/takeoff-calculator";
import { prepareTakeoff } from "@/components/calculators/takeoff/takeoff-fields";
import { TakeoffShowMe } from "@/components/calculators/takeoff/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "takeoff"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function TakeoffAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(takeoffOperation, await searchParams, prepareTakeoff);
  return (
    <CalculatorPage locale={locale} calculator={takeoff} showMeDrawing={<TakeoffShowMe />}>
      {(header) => <TakeoffCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
