import { printLength } from "@/calculators/length";
import { planOf } from "@/lib/client/set/plan-layers";
import type { Context } from "./context";
import { figureAdvance } from "./strip";
import type { Drawn, LineRole, MarkShape, Pair, PlanPart } from "./sheet";

const imperial: readonly { ratio: number; inch: string }[] = [
  { ratio: 12, inch: "1" }, { ratio: 16, inch: "3/4" }, { ratio: 24, inch: "1/2" }, { ratio: 32, inch: "3/8" }, { ratio: 48, inch: "1/4" }, { ratio: 64, inch: "3/16" }, { ratio: 96, inch: "1/8" }, { ratio: 128, inch: "3/32" }, { ratio: 192, inch: "1/16" }, { ratio: 384, inch: "1/32" }, { ratio: 768, inch: "1/64" },
];
const metricRatios = [10, 20, 25, 50, 75, 100, 125, 150, 200, 250, 300, 400, 500, 1000];
const timesSteps = [200, 100, 50, 20, 10, 5, 2, 1];
const room = { left: 24, right: 24, top: 26, bottom: 50 };
/** A letter stands outside its corner, or inside where the plan turns in: there the sides' figures have the room. */
const letter = { outside: 13, inside: 24 };
const plateDepth = 5;
const points = 72;

/** The foundation from above to a stated scale, every finished stage a layer; the chalk's inset is drawn larger by a stated round number. */
export function planPart({ set, stages, t, precision, metric }: Context, width: number, tallest: number): PlanPart | null {
  const plan = planOf(set, stages);
  const slab = plan.slab ?? plan.chalk;
  if (slab === undefined || slab.length < 3) return null;
  const [xs, ys] = [slab.map(([x]) => x), slab.map(([, y]) => y)];
  const [left, bottom, wide, high] = [Math.min(...xs), Math.min(...ys), Math.max(...xs) - Math.min(...xs), Math.max(...ys) - Math.min(...ys)];
  const least = points * Math.max(wide / (width - room.left - room.right), high / (tallest - room.top - room.bottom));
  const known = imperial.find(({ ratio }) => ratio >= least);
  const ratio = metric ? (metricRatios.find((step) => step >= least) ?? Math.ceil(least / 100) * 100) : (known?.ratio ?? Math.ceil(least / 12) * 12);
  const scale = points / ratio;
  const shift = room.left + (width - room.left - room.right - wide * scale) / 2;
  const height = room.top + high * scale + room.bottom;
  const place = ([x, y]: Pair): Pair => [shift + (x - left) * scale, room.top + (high - (y - bottom)) * scale];

  const chalk = plan.chalk !== undefined && plan.chalk.length === slab.length && plan.slab !== undefined ? plan.chalk : undefined;
  const greatest = Math.max(0, ...(chalk?.map(([x, y], index) => Math.hypot(x - slab[index]![0], y - slab[index]![1]) * scale) ?? []));
  const times = greatest < 1e-6 ? 1 : (timesSteps.find((step) => step * greatest <= 9) ?? 1);
  const drawnChalk = chalk?.map(([x, y], index): Pair => place([slab[index]![0] + (x - slab[index]![0]) * times, slab[index]![1] + (y - slab[index]![1]) * times]));
  const drawnSlab = slab.map(place);
  const base = drawnChalk ?? drawnSlab;
  const truth = plan.chalk ?? slab;
  const wallAt = (wall: string) => plan.walls.indexOf(wall.toLowerCase());
  const on = (wall: string, station: number, inward: number): Pair => {
    const index = Math.max(0, wallAt(wall));
    const [from, to] = [base[index % base.length]!, base[(index + 1) % base.length]!];
    const [a, b] = [truth[index % truth.length]!, truth[(index + 1) % truth.length]!];
    const share = station / (Math.hypot(b[0] - a[0], b[1] - a[1]) || 1);
    const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
    const length = Math.hypot(dx, dy) || 1;
    return [from[0] + dx * share + (dy / length) * inward, from[1] + dy * share - (dx / length) * inward];
  };

  const items: Drawn[] = [{ kind: "line", role: "slab", closed: true, points: drawnSlab }];
  for (const { wall, from, to } of plan.pieces ?? []) items.push({ kind: "line", role: "plate", closed: true, points: [on(wall, from, 0), on(wall, to, 0), on(wall, to, plateDepth), on(wall, from, plateDepth)] });
  if (drawnChalk !== undefined) items.push({ kind: "line", role: "chalk", closed: true, points: drawnChalk });
  for (const { wall, station } of plan.joists ?? []) items.push({ kind: "line", role: "joist", closed: false, points: [on(wall, station, -4), on(wall, station, plateDepth + 4)] });
  for (const { wall, station, tone } of plan.bolts ?? []) items.push({ kind: "mark", shape: tone, at: on(wall, station, plateDepth / 2) });
  drawnSlab.forEach((corner, index) => items.push({ kind: "text", text: String.fromCharCode(65 + index), at: letterAt(drawnSlab.at(index - 1)!, corner, drawnSlab[(index + 1) % drawnSlab.length]!), anchor: "middle", size: 13, font: "heading" }));
  slab.forEach((from, index) => items.push(...sideText(from, slab[(index + 1) % slab.length]!)));

  const bar = metric ? { inches: barOf([500, 1000, 2000, 5000, 10000], 25.4), } : { inches: barOf([2, 4, 8, 10, 20, 40], 1 / 12) };
  const [barLeft, barTop] = [shift, height - 16];
  const barEnd = barLeft + bar.inches * scale;
  items.push(
    { kind: "line", role: "bar", closed: false, points: [[barLeft, barTop], [barEnd, barTop]] },
    ...[barLeft, (barLeft + barEnd) / 2, barEnd].map((x): Drawn => ({ kind: "line", role: "bar", closed: false, points: [[x, barTop - 3], [x, barTop + 3]] })),
    { kind: "text", text: "0", at: [barLeft, barTop + 12], anchor: "middle", size: 7.5, font: "figure" },
    { kind: "text", text: printLength(bar.inches, precision), at: [barEnd, barTop + 12], anchor: "middle", size: 7.5, font: "figure" },
  );

  const tones = [...new Set(plan.bolts?.map(({ tone }) => tone) ?? [])];
  const legend: { sample: LineRole | MarkShape; text: string }[] = [
    { sample: "slab", text: t("sheet.plan.slab") },
    ...(drawnChalk === undefined ? [] : [{ sample: "chalk" as const, text: t("sheet.plan.chalk") }]),
    ...(plan.pieces === undefined ? [] : [{ sample: "plate" as const, text: t("sheet.plan.plate") }]),
    ...(plan.joists === undefined ? [] : [{ sample: "joist" as const, text: t("sheet.plan.joist") }]),
    ...tones.map((tone) => ({ sample: tone, text: t(`sheet.plan.${tone}`) })),
  ];
  const scaleText = metric || known === undefined ? t("sheet.plan.metricScale", { ratio }) : t("sheet.plan.scale", { inch: known.inch, ratio });
  return {
    drawing: { width, height, items },
    description: t("sheet.plan.description", { corners: slab.length, scale: scaleText, layers: legend.map(({ text }) => text).join(", ") }),
    ratio,
    scale: scaleText,
    notes: [times > 1 ? t("sheet.plan.exaggerated", { times }) : t("sheet.plan.true")],
    legend,
  };

  /** A side's length outside it, turned to run along. */
  function sideText(from: Pair, to: Pair): Drawn[] {
    const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
    const text = printLength(length, precision);
    const [a, b] = [place(from), place(to)];
    if (text.length * figureAdvance * 8.5 > length * scale) return [];
    const [dx, dy] = [(b[0] - a[0]) / (length * scale), (b[1] - a[1]) / (length * scale)];
    const upright = dx > 1e-9 || (Math.abs(dx) <= 1e-9 && dy < 0) ? 1 : -1;
    const out = upright === 1 ? 13 : 7; // the baseline stands nearer when the letters' feet look at the slab
    return [{ kind: "text", text, at: [(a[0] + b[0]) / 2 - dy * out, (a[1] + b[1]) / 2 + dx * out], anchor: "middle", size: 8.5, font: "figure", turn: (Math.atan2(dy * upright, dx * upright) * 180) / Math.PI }];
  }

  function letterAt(before: Pair, [x, y]: Pair, after: Pair): Pair {
    const unit = ([dx, dy]: Pair): Pair => [dx / (Math.hypot(dx, dy) || 1), dy / (Math.hypot(dx, dy) || 1)];
    const [one, other] = [unit([before[0] - x, before[1] - y]), unit([after[0] - x, after[1] - y])];
    const inward = unit([one[0] + other[0], one[1] + other[1]]);
    // With y downward a corner of a counter-clockwise plan turns out when this is positive.
    const turnsOut = one[0] * other[1] - one[1] * other[0] > 0;
    const away = turnsOut ? -letter.outside : -letter.inside;
    return [x + inward[0] * away, y + inward[1] * away + 4.5];
  }

  /** The longest round length that takes no more than half of the slab. */
  function barOf(steps: readonly number[], perInch: number): number {
    const lengths = steps.map((step) => step / perInch);
    return [...lengths].reverse().find((length) => length <= Math.max(wide / 2, lengths[0]!)) ?? lengths[0]!;
  }
}

