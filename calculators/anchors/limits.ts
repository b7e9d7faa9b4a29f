import { isMetric, Length, type Precision } from "../length";
import { CalculationError } from "../schema";
import { endMinimumFor, spacingFor, type Rule } from "../rules";

export const halfInch = Length.from(0.5);
export const defaultEndDistance = Length.from(8);
/** Closer than this, washers collide; trade practice, no rule states it. */
export const crowded = Length.from(3);

/** The limits of one wall under its rule, for bolts of one diameter. null: not stated. */
export interface Limits {
  diameter: Length;
  spacing: Length | null;
  endMinimum: Length | null;
  endMaximum: Length | null;
  /** At the first and last end of the wall. */
  wallEndMaximum: Length | null;
  boltsPerPiece: number | null;
}

export function limitsOf(rule: Rule, diameter: Length): Limits {
  const { endMaximum, foundationEndMaximum, boltsPerPiece } = rule;
  return {
    diameter,
    spacing: spacingFor(rule, diameter)?.value ?? null,
    endMinimum: endMinimumFor(rule, diameter),
    endMaximum: endMaximum.value,
    wallEndMaximum: least(endMaximum.value, foundationEndMaximum.value),
    boltsPerPiece: boltsPerPiece.value,
  };
}

/** The diameter asked for, else the rule's least, else 1/2 in. */
export function diameterOf(rule: Rule, asked: Length | undefined): Length {
  return asked ?? rule.diameter.value ?? halfInch;
}

/** The exception that holds for a whole wall of this length that joins offset braced panels; null when none does. */
export function shortWallException(rule: Rule, wallLength: Length, joinsOffsetPanels: boolean | undefined) {
  if (joinsOffsetPanels !== true) return null;
  const byLength = [...rule.shortWalls].sort((a, b) => a.upTo.compare(b.upTo));
  return byLength.find(({ upTo }) => wallLength.compare(upTo) <= 0) ?? null;
}

function least(a: Length | null, b: Length | null): Length | null {
  if (a === null || b === null) return a ?? b;
  return a.compare(b) <= 0 ? a : b;
}

/** 8 in, or the rule's limit where 8 in is outside it. */
export function endDistanceWithin(least: Length | null, most: Length | null): Length {
  if (least !== null && defaultEndDistance.compare(least) < 0) return least;
  return most !== null && defaultEndDistance.compare(most) > 0 ? most : defaultEndDistance;
}

/** Bolts that need not stand at an exact place stand on whole quarters of an inch, or 5 mm. */
export function evenMark(precision: Precision): Length {
  return isMetric(precision) ? Length.from(5, "mm") : Length.from(0.25);
}

/** A wall of more bolts than this is no wall of plates, and placing them would keep a server busy. */
export const mostBolts = 500;

/** @throws CalculationError `too-many-bolts` when the rule could ask these pieces for more than `mostBolts`. */
export function refuseTooMany({ spacing, boltsPerPiece }: Limits, lengths: readonly Length[]): void {
  const bySpacing = spacing === null ? 0 : lengths.reduce((sum, length) => sum + length.inches.div(spacing.inches).valueOf(), 0);
  if (bySpacing + lengths.length * (boltsPerPiece ?? 1) > mostBolts) throw new CalculationError([{ pointer: "/pieces", code: "too-many-bolts", params: { maximum: mostBolts } }]);
}
