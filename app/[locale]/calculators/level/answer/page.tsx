import type { Metadata } from "next";
import { level, levelOperation } from "@/calculators/level";
import { calculatorMetadata, CalculatorPage } from "@/components/calculators/calculator-page";
import { LevelCalculator } from "@/components/calculators/level/level-calculator";
import { prepareLevel } from "@/components/calculators/level/level-fields";
import { LevelShowMe } from "@/components/calculators/level/show-me-drawing";
import { answerOnServer, type SearchParams } from "@/lib/client/calculator/answer-on-server";
import type { Locale } from "@/lib/client/i18n/locales";

interface PageProps {
  params: Promise<{ locale: Locale }>;
  searchParams: Promise<SearchParams>;
}

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  return { ...calculatorMetadata((await params).locale, "level"), robots: { index: false } };
}

/** The answer to a form sent without script. */
export default async function LevelAnswerPage({ params, searchParams }: PageProps) {
  const { locale } = await params;
  const initial = answerOnServer(levelOperation, await searchParams, prepareLevel);
  return (
    <CalculatorPage locale={locale} calculator={level} showMeDrawing={<LevelShowMe />}>
      {(header) => <LevelCalculator header={header} initial={initial} />}
    </CalculatorPage>
  );
}
