"use client";

import { useEffect, useRef, useState, type ReactNode } from "react";
import { GoodMark, IdleMark, OutMark, TapeMark, WarnMark } from "./marks";

/** `plain` is an answer that judges nothing, such as a converted length; `idle` is no answer yet. */
export type VerdictTone = "good" | "out" | "warn" | "plain" | "idle";

const marks = { good: GoodMark, out: OutMark, warn: WarnMark, plain: TapeMark, idle: IdleMark } as const;

/** How long typing must rest before the answer is spoken. */
const restMilliseconds = 700;

interface VerdictProps {
  tone: VerdictTone;
  /** One line: the word and the figure. It alone stays in view while a field has focus on a phone. */
  title: ReactNode;
  children?: ReactNode;
  /** Sticks to the bottom of a phone's screen. Put it after the form, inside an element of class `calculator`. */
  sticky?: boolean;
}

/** The answer by word, mark and colour. A screen reader hears it once typing rests, from a status of its own. */
export function Verdict({ tone, title, children, sticky = true }: VerdictProps) {
  const shown = useRef<HTMLDivElement>(null);
  const [spoken, setSpoken] = useState("");
  useEffect(() => {
    const timer = setTimeout(() => setSpoken(shown.current?.textContent ?? ""), restMilliseconds);
    return () => clearTimeout(timer);
  });
  const Mark = marks[tone];
  return (
    <div className={sticky ? "verdict verdict-sticky" : "verdict"} data-tone={tone}>
      <div ref={shown}>
        <p className="verdict-title">
          <Mark />
          <span>{title}</span>
        </p>
        {children === undefined ? null : (
          <>
            {" "}
            <div className="verdict-body">{children}</div>
          </>
        )}
      </div>
      <p role="status" className="sr-only">
        {spoken}
      </p>
    </div>
  );
}
