"use client";

import { createContext, type ReactNode } from "react";
import type { Fields, FormState, IsLength } from "./form-fields";
import type { FormStore } from "./form-store";

/** What a calculator worked out, for whoever keeps its form. */
export interface Report {
  form: FormState;
  /** The plain input that was asked. */
  input: Record<string, unknown>;
  answer: unknown;
}

/** Where a form lives when it is not the page's own: a stage of a set keeps it, in place of the address. */
export interface FormHome {
  open(start: { defaults: Fields; isLength: IsLength }): FormStore;
  report(report: Report): void;
  /** Where the answer leads, in place of links to other pages. */
  next: ReactNode;
}

export const FormHomeContext = createContext<FormHome | null>(null);
