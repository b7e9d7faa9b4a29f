"use client";

import { useRef, useState, type ReactNode } from "react";
import type { LengthUnit, Precision } from "@/calculators/length";
import { fieldId } from "@/lib/client/calculator/field-id";
import { useLengthCore } from "@/lib/client/core/use-length-core";
import { useTranslate } from "@/lib/client/i18n/messages-context";
import { describedBy, Field } from "@/components/ui/field";
import { echoOf } from "./echo";
import { MarkKeys } from "./mark-keys";
import { TapeBlade } from "./tape-blade";

export interface LengthFieldProps {
  /** The name in the form and the address, dotted: `diagonals.ac`. The control's id is `field-` and this. */
  name: string;
  id?: string;
  /** Plain text, since the blade and its buttons are named after it. */
  label: string;
  hint?: ReactNode;
  value: string;
  onChange: (value: string) => void;
  /** What a bare number means. */
  unit: LengthUnit;
  precision: Precision;
  error?: ReactNode;
  required?: boolean;
  /** The strip of tape under a reading. */
  blade?: boolean;
  /** A diagonal's number, as in the drawing. */
  dot?: number;
  /** Where the tape was held, as typed; the echo then says the actual length. */
  burn?: string;
}

const echoKeys = { actual: "common.field.actual", inches: "common.field.inInches", plain: "common.field.echo" } as const;

/** How long the slim row outlives focus: a tap on what lies below must land before the row's place closes. */
const rowLingersMilliseconds = 350;

/**
 * The field for every length. Text, with a decimal keypad on a phone: the typed text is the value, read by the same parser
 * as the server's and echoed at the right in the other way to say it. Until the parser has come there is no echo, and the
 * field works as any other.
 */
export function LengthField({ name, id = fieldId(name), value, onChange, unit, precision, required, blade = false, burn, label, ...texts }: LengthFieldProps) {
  const t = useTranslate();
  const core = useLengthCore();
  const input = useRef<HTMLInputElement>(null);
  const [hasRow, setHasRow] = useState(false);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  // What was typed shows at once; the form may take it up after the paint (lib/client/calculator/typed-text.ts).
  const [draft, setDraft] = useState<string | null>(null);
  const [formValue, setFormValue] = useState(value);
  if (value !== formValue) {
    setFormValue(value);
    setDraft(null);
  }
  const shown = draft ?? value;
  const type = (text: string) => {
    setDraft(text);
    onChange(text);
  };
  const echo = core === null || shown.trim() === "" ? null : echoOf(core, shown, unit, precision, burn);

  const focus = () => {
    clearTimeout(timer.current);
    setHasRow(true);
  };
  const blur = () => {
    timer.current = setTimeout(() => setHasRow(false), rowLingersMilliseconds);
  };

  return (
    <Field id={id} label={label} {...texts} className={hasRow ? "length-field has-row" : "length-field"}>
      <div className="length-box">
        <input
          ref={input}
          id={id}
          name={name}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          autoCorrect="off"
          spellCheck={false}
          maxLength={80}
          className="length-input"
          value={shown}
          aria-required={required}
          aria-invalid={texts.error ? true : undefined}
          aria-describedby={describedBy(id, texts, `${id}-echo`)}
          onChange={(event) => type(event.target.value)}
          onFocus={focus}
          onBlur={blur}
        />
        <span id={`${id}-echo`} className="length-echo">
          {echo === null ? null : t.rich(echoKeys[echo.kind], { length: <span className="whitespace-nowrap">{echo.text}</span> })}
        </span>
      </div>
      <MarkKeys input={input} />
      {blade ? <TapeBlade core={core} label={label} value={shown} onChange={type} unit={unit} precision={precision} controls={id} /> : null}
    </Field>
  );
}
