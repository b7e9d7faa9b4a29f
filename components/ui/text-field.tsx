"use client";

import type { HTMLInputTypeAttribute } from "react";
import { fieldId } from "@/lib/client/calculator/field-id";
import { describedBy, Field, type FieldTexts } from "./field";

interface TextFieldProps extends FieldTexts {
  name: string;
  /** Made from `name` when not given. */
  id?: string;
  value: string;
  onChange: (value: string) => void;
  /** `decimal` for a plain number (never type=number: a wheel would change it); `numeric` for a count. */
  inputMode?: "decimal" | "numeric" | "text";
  type?: Extract<HTMLInputTypeAttribute, "text" | "email" | "url">;
  /** What it is counted in, shown at the right end. */
  suffix?: string;
}

/** A field for anything that is not a length: a count, a temperature, a name. */
export function TextField({ name, id = fieldId(name), value, onChange, inputMode = "decimal", type = "text", suffix, ...texts }: TextFieldProps) {
  return (
    <Field id={id} {...texts}>
      <div className="length-box">
        <input
          id={id}
          name={name}
          type={type}
          inputMode={inputMode}
          autoComplete="off"
          className="length-input"
          value={value}
          aria-describedby={describedBy(id, texts, suffix !== undefined && `${id}-suffix`)}
          aria-invalid={texts.error ? true : undefined}
          onChange={(event) => onChange(event.target.value)}
        />
        {suffix === undefined ? null : (
          <span id={`${id}-suffix`} className="length-echo">
            {suffix}
          </span>
        )}
      </div>
    </Field>
  );
}
