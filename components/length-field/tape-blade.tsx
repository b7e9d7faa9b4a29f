"use client";

import { useMemo, type KeyboardEvent, type MouseEvent } from "react";
import type { LengthUnit, Precision } from "@/calculators/length";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { bladeEnd, bladeReading, bladeStart, bladeSteps, bladeTicks, nudged, writtenLike } from "./blade-scale";
import type { LengthCore } from "./echo";

interface TapeBladeProps {
  core: LengthCore | null;
  label: string;
  value: string;
  onChange: (value: string) => void;
  unit: LengthUnit;
  precision: Precision;
  controls: string;
}

const keySteps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1 };

/** The stretch of tape the reading stands on. Tap a graduation, nudge by the end buttons, or use the arrow keys. */
export function TapeBlade({ core, label, value, onChange, unit, precision, controls }: TapeBladeProps) {
  const t = useTranslate();
  const ticks = useMemo(() => bladeTicks(precision), [precision]);
  const reading = useMemo(() => (core === null ? null : bladeReading(core, value, unit, precision)), [core, value, unit, precision]);
  const steps = bladeSteps[precision];

  const nudge = (graduations: number) => {
    if (core === null || reading === null) return;
    onChange(writtenLike(core, value, nudged(core, reading.length, precision, graduations), unit, precision));
  };
  const tap = (event: MouseEvent<HTMLDivElement>) => {
    if (core === null || reading === null) return;
    const box = event.currentTarget.getBoundingClientRect();
    const part = ((event.clientX - box.left) / box.width) * 100;
    const index = Math.round(((part - bladeStart) / (bladeEnd - bladeStart)) * steps);
    const tapped = reading.start.plus(core.graduation(precision).times(index));
    onChange(writtenLike(core, value, tapped.isNegative() ? core.Length.zero : tapped, unit, precision));
  };
  const press = (event: KeyboardEvent) => {
    const whole = event.key === "PageUp" ? steps : event.key === "PageDown" ? -steps : undefined;
    const step = keySteps[event.key] ?? whole;
    if (step === undefined) return;
    event.preventDefault();
    nudge(step);
  };

  return (
    <div className="blade" data-empty={reading === null || undefined}>
      <button type="button" className="blade-nudge" aria-label={`${label}: ${t("common.blade.less")}`} aria-controls={controls} onClick={() => nudge(-1)}>
        <NudgeMark back />
      </button>
      <div
        className="blade-face"
        role="slider"
        tabIndex={0}
        aria-label={t("common.blade.label", { field: label })}
        aria-valuemin={0}
        aria-valuemax={120000}
        aria-valuenow={reading?.length.toNumber() ?? 0}
        aria-valuetext={reading === null ? t("common.field.unreadable") : value}
        aria-disabled={reading === null || undefined}
        onClick={tap}
        onKeyDown={press}
      >
        <svg aria-hidden="true" focusable="false">
          {ticks.map(({ index, x, length, whole }) => (
            <line key={index} x1={`${x}%`} x2={`${x}%`} y1="0" y2={length} stroke="var(--ink)" strokeWidth={whole ? 2 : 1.3} />
          ))}
          {reading === null ? null : (
            <>
              <line x1={`${reading.x}%`} x2={`${reading.x}%`} y1="0" y2="54" stroke="var(--keel)" strokeWidth="3.5" />
              <svg x={`${reading.x}%`} overflow="visible">
                <path d="M0 54 l-7 11 h14z" fill="var(--keel)" />
              </svg>
              <text x={`${bladeStart}%`} y="46" dx="5" className="blade-label">
                {reading.labels[0]}
              </text>
              <text x={`${bladeEnd}%`} y="46" dx="-5" textAnchor="end" className="blade-label">
                {reading.labels[1]}
              </text>
            </>
          )}
        </svg>
      </div>
      <button type="button" className="blade-nudge" aria-label={`${label}: ${t("common.blade.more")}`} aria-controls={controls} onClick={() => nudge(1)}>
        <NudgeMark />
      </button>
    </div>
  );
}

/** One graduation and the way to go. */
function NudgeMark({ back = false }: { back?: boolean }) {
  return (
    <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true" focusable="false">
      <path d={back ? "M16 2v16M11 4v12L2.5 10z" : "M4 2v16M9 4v12l8.5-6z"} fill="currentColor" stroke="currentColor" strokeWidth="1.6" />
    </svg>
  );
}
