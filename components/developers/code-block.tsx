"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";

interface CodeBlockProps {
  id: string;
  code: string;
  /** What it is, for those who do not see it. */
  label: string;
  words: { copy: string; copied: string; notCopied: string };
}

/** Code to read, scroll and copy. */
export function CodeBlock({ id, code, label, words }: CodeBlockProps) {
  const [said, setSaid] = useState<keyof typeof words>("copy");
  const copy = () =>
    void Promise.resolve()
      .then(() => navigator.clipboard.writeText(code)) // absent without TLS
      .then(
        () => setSaid("copied"),
        () => setSaid("notCopied"),
      );
  return (
    <div className="code-block">
      {/* Focusable, so that the keyboard can scroll it. */}
      <pre id={id} tabIndex={0} role="region" aria-label={label}>
        <code>{code}</code>
      </pre>
      <Button kind="ghost" small onClick={copy} onBlur={() => setSaid("copy")}>
        <span aria-live="polite">{words[said]}</span>
      </Button>
    </div>
  );
}
