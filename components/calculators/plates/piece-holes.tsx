"use client";

import { useState } from "react";
import type { PlatesAnswer } from "@/calculators/plates";
import { Button } from "@/components/ui/button";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";

/** Pieces shown at once; a house's holes are many rows, and most people bore one wall at a time. */
const atOnce = 40;

/** Each piece's holes: running from the end nearer the wall's first corner, and across from the outer edge. */
export function PieceHoles({ answer }: { answer: PlatesAnswer }) {
  const t = useTranslate();
  const [all, setAll] = useState(false);
  if (answer.walls.length === 0) return null;
  const pieces = all ? answer.pieces : answer.pieces.slice(0, atOnce);
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
      {pieces.length < answer.pieces.length ? (
        <Button kind="ghost" className="no-print" onClick={() => setAll(true)}>
          {t("plates.holes.more", { count: answer.pieces.length - pieces.length })}
        </Button>
      ) : null}
    </section>
  );
}
