"use client";

import { useId } from "react";
import { Concrete } from "@/components/drawing/plan-parts";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { alongWall, frameOf, planOf, type Pair } from "@/lib/client/set/plan-layers";
import type { SillSet } from "@/lib/client/set/schema";
import type { Stage } from "@/lib/client/set/stages";

const box = 390;
const margin = 44;
const plateDepth = 9;

const path = (points: readonly Pair[]) => points.map(([x, y]) => `${x},${y}`).join(" ");
const lengthOf = (points: readonly Pair[], wall: number) => {
  const [from, to] = [points[wall % points.length]!, points[(wall + 1) % points.length]!];
  return Math.hypot(to[0] - from[0], to[1] - from[1]);
};

/** The foundation from above; each finished stage adds its layer. */
export function SetPlan({ set, stages }: { set: SillSet; stages: readonly Stage[] }) {
  const t = useTranslate();
  const id = useId();
  const plan = planOf(set, stages);
  const { slab } = plan;
  if (slab === undefined || slab.length < 3) return <p className="set-plan-empty">{t("set.plan.empty")}</p>;

  const frame = frameOf(slab, plan.chalk, box, margin, 320);
  const base = frame.chalk ?? frame.slab;
  const truth = plan.chalk ?? slab;
  const wallAt = (name: string) => Math.max(0, plan.walls.indexOf(name));
  const at = (wall: string, station: number, inward: number) => alongWall(base, wallAt(wall), station / (lengthOf(truth, wallAt(wall)) || 1), inward);
  const middle: Pair = [frame.slab.reduce((sum, [x]) => sum + x, 0) / frame.slab.length, frame.slab.reduce((sum, [, y]) => sum + y, 0) / frame.slab.length];
  const counted = (["bolts", "pieces", "holes", "joists"] as const).flatMap((layer) => (plan[layer] === undefined ? [] : [t(`set.plan.${layer}`, { count: plan[layer].length })]));
  const layers = [t("set.plan.slab"), ...(plan.chalk === undefined ? [] : [t("set.plan.chalk")]), ...counted];
  const tones = [...new Set(plan.bolts?.map(({ tone }) => tone) ?? [])];
  return (
    <figure className="set-plan">
      <svg className="plan" viewBox={`0 0 ${box} ${frame.height}`} role="img" aria-labelledby={`${id}-t ${id}-d`}>
        <title id={`${id}-t`}>{t("set.plan.title")}</title>
        <desc id={`${id}-d`}>{t("set.plan.description", { layers: layers.join(", ") })}</desc>
        <Concrete id={`${id}-c`} points={frame.slab.map(([x, y]) => ({ x, y }))} />
        {plan.pieces?.map(({ wall, from, to }, index) => (
          <polygon key={index} points={path([at(wall, from, 0), at(wall, to, 0), at(wall, to, plateDepth), at(wall, from, plateDepth)])} fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="1.2" />
        ))}
        {frame.chalk === undefined ? null : <polygon points={path(frame.chalk)} fill="none" stroke="var(--chalk-line)" strokeWidth="2.2" />}
        {plan.joists?.map(({ wall, station }, index) => {
          const [from, to] = [at(wall, station, -6), at(wall, station, plateDepth + 3)];
          return <line key={index} x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} stroke="var(--ink)" strokeWidth="1" />;
        })}
        {plan.bolts?.map((bolt, index) => (
          <Bolt key={index} at={at(bolt.wall, bolt.station, plateDepth / 2)} tone={bolt.tone} />
        ))}
        {plan.holes?.map(({ wall, station }, index) => {
          const [x, y] = at(wall, station, plateDepth / 2);
          return <circle key={index} cx={x} cy={y} r="5.4" fill="none" stroke="var(--timber-edge)" strokeWidth="1.2" />;
        })}
        {frame.slab.map(([x, y], index) => (
          <text key={index} x={x + (x < middle[0] ? -14 : 14)} y={y + (y < middle[1] ? -8 : 20)} textAnchor="middle" className="disp">
            {String.fromCharCode(65 + index)}
          </text>
        ))}
      </svg>
      <figcaption className="plan-caption">
        {frame.times > 1 ? t("set.plan.exaggerated", { times: frame.times }) : t("set.plan.toScale")}
        {tones.length === 0 ? null : (
          <span className="set-legend">
            {tones.map((tone) => (
              <span key={tone}>
                <svg width="16" height="16" viewBox="0 0 16 16" aria-hidden="true" focusable="false">
                  <Bolt at={[8, 8]} tone={tone} />
                </svg>
                {t(`set.plan.${tone}`)}
              </span>
            ))}
          </span>
        )}
      </figcaption>
    </figure>
  );
}

/** Told apart by shape as well as colour: dot, crossed square, ring to be drilled, diamond of the engineer. */
function Bolt({ at: [x, y], tone }: { at: Pair; tone: "good" | "bad" | "added" | "engineered" }) {
  if (tone === "bad") return <path d={`M${x - 4} ${y - 4}h8v8h-8zM${x - 4} ${y - 4}l8 8M${x + 4} ${y - 4}l-8 8`} fill="var(--sheet)" stroke="var(--keel)" strokeWidth="1.6" />;
  if (tone === "added") return <circle cx={x} cy={y} r="4" fill="var(--sheet)" stroke="var(--keel)" strokeWidth="2" />;
  if (tone === "engineered") return <path d={`M${x} ${y - 5}l5 5-5 5-5-5z`} fill="var(--amber)" />;
  return <circle cx={x} cy={y} r="3.6" fill="var(--steel)" />;
}
