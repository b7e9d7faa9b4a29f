"use client";

import { useState, type MouseEvent } from "react";
import { pathOf } from "@/components/drawing/plan-geometry";
import { Button } from "@/components/ui/button";
import { Disclosure } from "@/components/ui/disclosure";
import { Segmented } from "@/components/ui/segmented";
import { useLengthCore } from "@/lib/client/core/use-length-core";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import type { PlanForm } from "../plan/inset-inputs";

const cell = 24;
const [columns, lines] = [16, 13];
const [startColumn, startLine] = [2, 11];
const squares = { "ft-in": ["1 ft", "2 ft", "4 ft"], mm: ["0.5 m", "1 m", "2 m"] } as const;
const inchesOf: Readonly<Record<string, number>> = { "1 ft": 12, "2 ft": 24, "4 ft": 48, "0.5 m": 500 / 25.4, "1 m": 1000 / 25.4, "2 m": 2000 / 25.4 };
const steps: Readonly<Record<string, readonly [number, number]>> = { E: [1, 0], N: [0, -1], W: [-1, 0], S: [0, 1] };

/**
 * A grid on which a plan is tapped out corner by corner; every tap adds a run. The rows beside it do the same by typing, so the pad is
 * hidden from screen readers.
 */
export function TapPad({ form }: { form: PlanForm }) {
  const t = useTranslate();
  const core = useLengthCore();
  const sizes = squares[form.unit === "mm" || form.unit === "m" || form.unit === "cm" ? "mm" : "ft-in"];
  const [chosen, setSquare] = useState<string>("");
  const square = (sizes as readonly string[]).includes(chosen) ? chosen : sizes[1];
  const perSquare = inchesOf[square]!;
  const runs = typedRuns(form);
  const corners = cornersOf(runs, (text) => core?.parseLength(text, form.unit).toNumber() ?? null, perSquare);
  const here = corners.at(-1)!;

  const tap = (event: MouseEvent<SVGSVGElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const column = Math.round(((event.clientX - box.left) / box.width) * columns) - here.x;
    const line = Math.round(((event.clientY - box.top) / box.height) * lines) - here.y;
    const along = Math.abs(column) >= Math.abs(line) ? column : line;
    const count = Math.round(Math.abs(along) * 1000) / 1000;
    if (count === 0) return;
    const toward = along === column ? (column > 0 ? "E" : "W") : line > 0 ? "S" : "N";
    const [amount, unit] = square.split(" ") as [string, string];
    form.change({ [`runs.${runs.length}.toward`]: toward, [`runs.${runs.length}.length`]: `${Math.round(Number(amount) * count * 1000) / 1000} ${unit}` });
  };
  const undo = () => form.change({ [`runs.${runs.length - 1}.length`]: "" });

  return (
    <Disclosure summary={t("footprint.tap.title")}>
      <p>{t("footprint.tap.hint")}</p>
      <Segmented name="square" legend={t("footprint.tap.square")} value={square} onChange={setSquare} options={sizes.map((value) => ({ value, label: value }))} />
      <svg className="plan-pad no-print" viewBox={`0 0 ${columns * cell} ${lines * cell}`} aria-hidden="true" focusable="false" onClick={tap}>
        <path d={gridPath} fill="none" stroke="var(--rule)" strokeWidth="1" />
        <polyline points={pathOf(corners.map(pixels))} fill="none" stroke="var(--chalk-line)" strokeWidth="3" />
        {corners.map((corner, index) => (
          <circle key={index} cx={corner.x * cell} cy={corner.y * cell} r={index === corners.length - 1 ? 7 : 4} fill="var(--chalk)" />
        ))}
      </svg>
      <div className="plan-pad-buttons no-print">
        <Button kind="ghost" small onClick={undo} disabled={runs.length === 0}>
          {t("footprint.tap.undo")}
        </Button>
      </div>
    </Disclosure>
  );
}

interface Typed {
  toward: string;
  length: string;
}

/** The runs filled in so far, from the first. */
function typedRuns(form: PlanForm): Typed[] {
  const found: Typed[] = [];
  for (let row = 0; row < form.rows("runs") && form.value(`runs.${row}.length`).trim() !== ""; row += 1) found.push({ toward: form.value(`runs.${row}.toward`), length: form.value(`runs.${row}.length`) });
  return found;
}

/** In squares of the grid, as far as lengths can be read and directions are one of the four. */
function cornersOf(runs: readonly Typed[], inches: (text: string) => number | null, perSquare: number) {
  const corners = [{ x: startColumn, y: startLine }];
  for (const { toward, length } of runs) {
    const step = steps[toward];
    const size = step === undefined ? null : read(length, inches);
    if (step === undefined || size === null) break;
    const last = corners.at(-1)!;
    corners.push({ x: last.x + (step[0] * size) / perSquare, y: last.y + (step[1] * size) / perSquare });
  }
  return corners;
}

function read(text: string, inches: (text: string) => number | null): number | null {
  try {
    return inches(text);
  } catch {
    return null; // half typed: the field says what is wrong
  }
}

const pixels = ({ x, y }: { x: number; y: number }) => ({ x: x * cell, y: y * cell });

const gridPath = [
  ...Array.from({ length: columns + 1 }, (_, column) => `M${column * cell} 0V${lines * cell}`),
  ...Array.from({ length: lines + 1 }, (_, line) => `M0 ${line * cell}H${columns * cell}`),
].join("");
