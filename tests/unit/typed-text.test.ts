import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { createTypedText } from "@/lib/client/calculator/typed-text";

beforeEach(() => {
  vi.useFakeTimers();
  vi.stubGlobal("requestAnimationFrame", (run: () => void) => setTimeout(run, 16));
});

afterEach(() => {
  vi.unstubAllGlobals();
  vi.useRealTimers();
});

test("the form is told after the paint, once, with the last text of each field", () => {
  const told: Record<string, string>[] = [];
  const typed = createTypedText((fields) => told.push(fields));
  typed.type("length", "2");
  typed.type("length", "28");
  typed.type("width", "22");
  vi.advanceTimersByTime(15);
  expect(told).toEqual([]);
  vi.advanceTimersByTime(10);
  expect(told).toEqual([{ length: "28", width: "22" }]);
});

test("whoever reads the form before the paint has it told first, and nothing is told twice", () => {
  const told: Record<string, string>[] = [];
  const typed = createTypedText((fields) => told.push(fields));
  typed.type("length", "28'");
  typed.flush();
  typed.flush();
  vi.advanceTimersByTime(100);
  expect(told).toEqual([{ length: "28'" }]);
});
