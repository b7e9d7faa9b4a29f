"use client";

import { useId } from "react";
import type { PlatesAnswer } from "@/calculators/plates";
import { pixel } from "@/components/drawing/plan-geometry";
import { LengthText } from "@/components/ui/length-text";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { useFold } from "./use-fold";

const box = 360;
const height = 26;

/** Every board with the pieces cut from it, drawn to one scale and said beside. */
export function CutList({ answer }: { answer: PlatesAnswer }) {
  const t = useTranslate();
  const [boards, more] = useFold(answer.boards, 16);
  const longest = Math.max(...answer.boards.map(({ stock }) => stock.in), 1);
  return (
    <section aria-labelledby="cut-title">
      <h2 id="cut-title">{t("plates.cut.title")}</h2>
      <p>{t("plates.cut.intro")}</p>
      <ol className="cut-list">
        {boards.map((board, index) => (
          <li key={index}>
            <p>
              <b>{t("plates.cut.board", { number: index + 1 })}</b> <LengthText text={board.stock.text} />
            </p>
            <BoardDrawing answer={answer} board={board} perInch={box / longest} />
            <ul className="cut-pieces">
              {board.pieces.map((id) => (
                <li key={id}>
                  {id} <LengthText text={answer.pieces.find((piece) => piece.id === id)!.length.text} />
                </li>
              ))}
              <li className="cut-left">{board.uncut ? t("plates.cut.uncut") : t.rich("plates.cut.offcut", { offcut: <LengthText text={board.offcut.text} /> })}</li>
            </ul>
          </li>
        ))}
      </ol>
      {more}
    </section>
  );
}

function BoardDrawing({ answer, board, perInch }: { answer: PlatesAnswer; board: PlatesAnswer["boards"][number]; perInch: number }) {
  const id = useId();
  const lengths = board.pieces.map((piece) => answer.pieces.find((candidate) => candidate.id === piece)!.length.in);
  return (
    <svg viewBox={`0 0 ${box} ${height}`} className="plan" aria-hidden="true" focusable="false">
      <defs>
        <pattern id={id} width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
          <path d="M0 0V8" stroke="var(--edge)" strokeWidth="2" />
        </pattern>
      </defs>
      <rect x="1" y="1" width={pixel(board.stock.in * perInch - 2)} height={height - 2} fill={`url(#${id})`} stroke="var(--edge)" strokeWidth="1.5" />
      {board.pieces.map((piece, index) => {
        const x = pixel(lengths.slice(0, index).reduce((sum, length) => sum + length, 0) * perInch);
        const width = pixel(lengths[index]! * perInch);
        return (
          <g key={piece}>
            <rect x={x + 1} y="1" width={Math.max(1, width - 2)} height={height - 2} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
            {width < 34 ? null : (
              <text x={pixel(x + width / 2)} y="18" textAnchor="middle" className="num small">
                {piece}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}
