import type { Metadata } from "next";
import { plates, platesOperation } from "@/calculators/plates";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { PlatesCalculator } from "@/components/calculators/plates/plates-calculator";
import { preparePlates } from "@/components/calculators/plates/plates-fields";
import { PlatesShowMe } from "@/components/calculators/plates/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "plates"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function PlatesAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(platesOperation, await searchParams, preparePlates);
  return (
    <CalculatorPage locale={locale} calculator={plates} showMeDrawing={<PlatesShowMe />}>
      {(header) => <PlatesCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
