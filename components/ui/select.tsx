"use client";

import { fieldId } from "@/lib/client/calculator/field-id";
import { describedBy, Field, type FieldTexts } from "./field";

interface SelectProps extends FieldTexts {
  name: string;
  /** Made from `name` when not given. */
  id?: string;
  options: readonly { value: string; label: string }[];
  value: string;
  onChange: (value: string) => void;
}

/** A choice from a list, by the browser's own control. */
export function Select({ name, id = fieldId(name), options, value, onChange, ...texts }: SelectProps) {
  return (
    <Field id={id} {...texts}>
      <select
        id={id}
        name={name}
        className="control"
        value={value}
        aria-describedby={describedBy(id, texts)}
        aria-invalid={texts.error ? true : undefined}
        onChange={(event) => onChange(event.target.value)}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
