"use client";

import type { ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { fieldId } from "@/lib/client/calculator/field-id";
import type { PlanForm } from "./inset-inputs";

interface RowListProps {
  form: PlanForm;
  list: string;
  title: string;
  rows: number;
  most: number;
  /** The field of a new row that takes focus. */
  first: string;
  add: string;
  remove: (row: number) => string;
  /** Set together with a new row. */
  fresh?: (row: number) => Readonly<Record<string, string>>;
  children: (row: number) => ReactNode;
  /** Rows that a browser without script gets beside these. */
  blanks?: ReactNode;
  /** Below the list: another way to fill it. */
  after?: ReactNode;
}

/** Rows that can be added and taken away; a new one takes focus. */
export function RowList({ form, list, title, rows, most, first, add, remove, fresh, children, blanks, after }: RowListProps) {
  const grow = () => {
    form.change({ [`${list}.${rows}.${first}`]: "", ...fresh?.(rows) });
    requestAnimationFrame(() => document.getElementById(fieldId(`${list}.${rows}.${first}`))?.focus());
  };
  return (
    <fieldset className="plan-rows">
      <legend className="plan-rows-title">{title}</legend>
      {Array.from({ length: rows }, (_, row) => (
        <div key={row} className="plan-row">
          {children(row)}
          {row < form.rows(list) ? (
            <Button kind="ghost" small className="no-print" onClick={() => form.removeRow(list, row)}>
              {remove(row)}
            </Button>
          ) : null}
        </div>
      ))}
      {blanks === undefined ? null : <noscript>{blanks}</noscript>}
      <Button kind="ghost" small className="no-print" onClick={grow} disabled={rows >= most}>
        {add}
      </Button>
      {after}
    </fieldset>
  );
}
