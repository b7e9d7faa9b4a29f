import { notFound } from "next/navigation";
import { problemCodes, problemPath, type ProblemCode } from "@/api-spec";
import { ProblemPage } from "@/components/developers/problem-pages";
import { pageMetadata } from "@/components/site/page-metadata";
import { getTranslate } from "@/lib/client/i18n/load-messages";
import { pageLocale } from "@/lib/client/i18n/page-locale";

interface PageProps {
  params: Promise<{ locale: string; code: string }>;
}

export function generateStaticParams() {
  return problemCodes.map((code) => ({ code }));
}

async function problemCode({ params }: PageProps): Promise<ProblemCode> {
  const { code } = await params;
  return problemCodes.find((known) => known === code) ?? notFound();
}

export async function generateMetadata(props: PageProps) {
  const locale = await pageLocale(props);
  const code = await problemCode(props);
  const t = getTranslate(locale, ["developers"]);
  return pageMetadata(locale, problemPath(code), t(`developers.problems.${code}.title`), t(`developers.problems.${code}.cause`));
}

export default async function Page(props: PageProps) {
  return <ProblemPage locale={await pageLocale(props)} code={await problemCode(props)} />;
}
