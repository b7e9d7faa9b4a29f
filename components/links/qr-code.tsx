"use client";

import { useEffect, useState } from "react";

/** Modules of white around the code, as ISO/IEC 18004 asks. */
const quietZone = 4;

/** A text as a square code, black on white in every theme, since cameras want it so. Its encoder is loaded when it is needed. */
export function QrCode({ text, label }: { text: string; label: string }) {
  const [modules, setModules] = useState<readonly (readonly boolean[])[] | null>(null);
  useEffect(() => {
    let wanted = true;
    void import("uqr").then(({ encode }) => {
      if (wanted) setModules(encode(text, { ecc: "M", border: 0 }).data);
    });
    return () => {
      wanted = false;
    };
  }, [text]);

  if (modules === null) return <div className="qr-code" aria-hidden="true" />;
  const size = modules.length + 2 * quietZone;
  const path = modules.flatMap((row, y) => row.flatMap((dark, x) => (dark ? [`M${x + quietZone} ${y + quietZone}h1v1h-1z`] : []))).join("");
  return (
    <svg className="qr-code" viewBox={`0 0 ${size} ${size}`} role="img" aria-label={label} shapeRendering="crispEdges">
      <rect width={size} height={size} fill="#fff" />
      <path d={path} fill="#000" />
    </svg>
  );
}
