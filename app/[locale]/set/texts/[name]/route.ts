import { calculators } from "@/calculators";
import { stageTexts } from "@/components/set/stage-texts";
import { isLocale, locales } from "@/lib/client/i18n/locales";

/** Compiled messages as static files, one for each calculator and language: a set fetches a stage's when it opens it, and the service worker keeps them all. */
export const dynamic = "force-static";
export const dynamicParams = false;

export function generateStaticParams() {
  const names = ["reading", "sheet", ...calculators.map(({ name }) => name)];
  return locales.flatMap((locale) => names.map((name) => ({ locale, name })));
}

export async function GET(_: Request, { params }: { params: Promise<{ locale: string; name: string }> }): Promise<Response> {
  const { locale, name } = await params;
  if (!isLocale(locale)) return new Response(null, { status: 404 });
  return Response.json(stageTexts(locale, name));
}
