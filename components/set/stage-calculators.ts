"use client";

import type { ComponentType, ReactNode } from "react";

type StageCalculator = ComponentType<{ header: ReactNode }>;

/** The calculators' own pieces by folder name, each fetched with its stage. A test fails while one with a stage is missing here. */
export const stageCalculators: Readonly<Record<string, () => Promise<StageCalculator>>> = {
  squareness: () => import("@/components/calculators/squareness/squareness-calculator").then((module) => module.SquarenessCalculator),
  footprint: () => import("@/components/calculators/footprint/footprint-calculator").then((module) => module.FootprintCalculator),
  level: () => import("@/components/calculators/level/level-calculator").then((module) => module.LevelCalculator),
  inset: () => import("@/components/calculators/inset/inset-calculator").then((module) => module.InsetCalculator),
  fit: () => import("@/components/calculators/fit/fit-calculator").then((module) => module.FitCalculator),
  anchors: () => import("@/components/calculators/anchors/anchors-calculator").then((module) => module.AnchorsCalculator),
  plates: () => import("@/components/calculators/plates/plates-calculator").then((module) => module.PlatesCalculator),
  takeoff: () => import("@/components/calculators/takeoff/takeoff-calculator").then((module) => module.TakeoffCalculator),
  marks: () => import("@/components/calculators/marks/marks-calculator").then((module) => module.MarksCalculator),
};
