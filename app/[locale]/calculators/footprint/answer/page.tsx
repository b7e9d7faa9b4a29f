import type { Metadata } from "next";
import { footprint, footprintOperation } from "@/calculators/footprint";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { FootprintCalculator } from "@/components/calculators/footprint/footprint-calculator";
import { prepareFootprint } from "@/components/calculators/footprint/footprint-fields";
import { FootprintShowMe } from "@/components/calculators/footprint/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "footprint"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function FootprintAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(footprintOperation, await searchParams, prepareFootprint);
  return (
    <CalculatorPage locale={locale} calculator={footprint} showMeDrawing={<FootprintShowMe />}>
      {(header) => <FootprintCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
