"use client";

import type { ReactNode } from "react";
import type { footprintAnswer, FootprintAnswer } from "@/calculators/footprint";
import { calculatorAddress } from "@/lib/client/calculator/calculator-address";
import { useCalculator, type Initial } from "@/lib/client/calculator/use-calculator";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { CalculatorWorkspace, type Carry } from "../calculator-workspace";
import { FootprintDrawing } from "./footprint-drawing";
import { defaults, isLengthField, prepareFootprint } from "./footprint-fields";
import { FootprintInputs } from "./footprint-inputs";
import { FootprintResults } from "./footprint-results";
import { FootprintVerdict } from "./footprint-verdict";

/** Any plan: walked round, written out, tapped, or pulled corner to corner. */
export function FootprintCalculator({ header, initial }: { header: ReactNode; initial?: Initial<FootprintAnswer> }) {
  const t = useTranslate();
  const form = useCalculator<typeof footprintAnswer>({ name: "footprint", load: () => import("./core").then(({ loaded }) => loaded), isLength: isLengthField, defaults, prepare: prepareFootprint, initial });
  const { answer, unit } = form;
  const metric = unit !== "in" && unit !== "ft";
  const burn = form.value("burn");
  return (
    <CalculatorWorkspace
      form={form}
      name="footprint"
      operation="footprints"
      header={header}
      drawing={<FootprintDrawing answer={answer} />}
      fields={<FootprintInputs form={form} answer={answer} />}
      verdict={<FootprintVerdict answer={answer} metric={metric} />}
      results={answer === null ? null : <FootprintResults answer={answer} metric={metric} burned={burn !== "" && burn !== "0"} />}
      carries={answer === null ? [] : carriesOf(answer, form.value, t)}
    />
  );
}

/** On to the best fit with the corners as built, and to the bolts of the first wall. */
function carriesOf({ corners, lines, bows }: FootprintAnswer, value: (name: string) => string, t: ReturnType<typeof useTranslate>): Carry[] {
  const first = lines[0];
  if (first === undefined || corners.some(({ x }) => x === null)) return [];
  const rounded = (inches: number | null) => `${Math.round((inches ?? 0) * 1e6) / 1e6} in`;
  const places = Object.fromEntries(corners.map(({ name, x, y }) => [name, { x: rounded(x), y: rounded(y) }]));
  const edges = bows.map(({ side, station, outward }) => ({ wall: side, station: rounded(station.in), offset: rounded(outward.in) }));
  const piece = first.chalk ?? first.length;
  return [
    { href: calculatorAddress(t.locale, "fit", { corners: places, inset: value("inset") || defaults.inset, edges }), label: t("footprint.carry.fit") },
    { href: calculatorAddress(t.locale, "anchors", { mode: "layout", pieces: [`${piece.exact ?? piece.in} in`] }), label: t("footprint.carry.bolts") },
  ];
}
