import type { Source } from "@/calculators/schema";
import type { Translate } from "@/lib/client/i18n/translate";

/** Where the figures are from, and how far each was read. Works in server and client components: give it the translator. */
export function Sources({ sources, t }: { sources: readonly Source[]; t: Translate }) {
  return (
    <ul className="sources">
      {sources.map(({ title, clause, status, address }) => (
        <li key={`${title} ${clause ?? ""}`}>
          <cite>{address === undefined ? title : <a href={address}>{title}</a>}</cite>
          {clause === undefined ? null : <span>, {clause}</span>}
          <span className="sources-status"> ({t(`common.sourceStatus.${status}`)})</span>
        </li>
      ))}
    </ul>
  );
}
