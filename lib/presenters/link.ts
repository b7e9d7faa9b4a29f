import "server-only";
import type { LinkAnswer, MadeLink } from "@/api-spec";
import { localePath, type Locale } from "@/lib/client/i18n/locales";
import { env } from "@/lib/env";
import { deletedAfter } from "@/lib/services/links/delete-unopened";
import type { OpenedLink } from "@/lib/services/links/open-link";
import type { ShortLink } from "@/models";

export function presentMadeLink(link: ShortLink): MadeLink {
  return {
    id: link.id,
    url: `${env.SITE_URL}${localePath(link.locale as Locale, `/c/${link.id}`)}`,
    calculator: link.calculator,
    operation: link.operation,
    version: link.version,
    createdAt: link.createdAt.toISOString(),
    deletedAfter: deletedAfter(link.lastOpenedAt).toISOString(),
  };
}

export function presentLink({ link, current }: OpenedLink): LinkAnswer {
  const { version, newer, differs, answer, issues } = current;
  return {
    ...presentMadeLink(link),
    input: link.inputs as Record<string, unknown>,
    answer: link.answer as Record<string, unknown>,
    current: { version, newer, differs, answer: differs ? answer : null, errors: issues.map(({ pointer, code }) => ({ pointer, code })) },
  };
}
