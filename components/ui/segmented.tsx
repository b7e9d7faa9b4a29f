"use client";

import { useId, type ReactNode } from "react";

export interface SegmentedOption {
  value: string;
  label: ReactNode;
  /** Read in place of a label that is only a mark. */
  spoken?: string;
}

interface SegmentedProps {
  name: string;
  legend: ReactNode;
  /** `hidden` keeps the legend for screen readers only. */
  legendIs?: "shown" | "hidden";
  hint?: ReactNode;
  options: readonly SegmentedOption[];
  value: string;
  onChange: (value: string) => void;
}

/** A few choices side by side: a group of real radio buttons, so that it is sent with a form and works without script. */
export function Segmented({ name, legend, legendIs = "shown", hint, options, value, onChange }: SegmentedProps) {
  const hintId = useId();
  return (
    <fieldset className="seg-group" aria-describedby={hint === undefined ? undefined : hintId}>
      <legend className={legendIs === "hidden" ? "sr-only" : "field-label seg-legend"}>{legend}</legend>
      {hint === undefined ? null : (
        <p id={hintId} className="field-hint seg-hint">
          {hint}
        </p>
      )}
      <div className="seg">
        {options.map((option) => (
          <label key={option.value} className="seg-item">
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={option.value === value}
              aria-label={option.spoken}
              onChange={() => onChange(option.value)}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
