"use client";

import type { PlatesAnswer } from "@/calculators/plates";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { useFold } from "./use-fold";

/** Each piece's holes: running from the end nearer the wall's first corner, and across from the outer edge. */
export function PieceHoles({ answer }: { answer: PlatesAnswer }) {
  const t = useTranslate();
  const [pieces, more] = useFold(answer.pieces, 16);
  if (answer.walls.length === 0) return null;
  return (
    <section aria-labelledby="holes-title">
      <h2 id="holes-title">{t("plates.holes.title")}</h2>
      <p>{t("plates.holes.intro")}</p>
      <div className="overflow-x-auto">
        <table className="data-table">
          <thead>
            <tr>
              <th scope="col">{t("plates.holes.piece")}</th>
              <th scope="col" className="figure">{t("plates.holes.running")}</th>
              <th scope="col" className="figure">{t("plates.holes.across")}</th>
              <th scope="col">{t("plates.holes.kind")}</th>
            </tr>
          </thead>
          {pieces.map(({ id, length, holes }) => (
            <tbody key={id}>
              {(holes.length === 0 ? [null] : holes).map((hole, index) => (
                <tr key={index}>
                  {index === 0 ? (
                    <th scope="rowgroup" rowSpan={Math.max(1, holes.length)}>
                      {id} <LengthText text={length.text} />
                    </th>
                  ) : null}
                  <td className="figure">{hole === null ? t("plates.holes.none") : <LengthText text={hole.running.text} />}</td>
                  <td className="figure">{hole === null ? null : hole.across === null ? t("plates.holes.unknown") : <LengthText text={hole.across.text} />}</td>
                  <td>{hole === null || hole.kind === "bolt" ? null : t(`plates.holes.${hole.kind}`)}</td>
                </tr>
              ))}
            </tbody>
          ))}
        </table>
      </div>
      {more}
    </section>
  );
}
