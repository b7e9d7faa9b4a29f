"use client";

import dynamic from "next/dynamic";

/** 400 kB that only this page needs, and only in the browser. */
const SwaggerReference = dynamic(() => import("./swagger-reference").then(({ SwaggerReference: reference }) => reference), { ssr: false });

export function ApiReference({ loading }: { loading: string }) {
  return (
    <div className="api-reference" lang="en">
      <noscript>
        <a href="/api/v1/openapi.json">openapi.json</a>
      </noscript>
      <SwaggerReference loading={loading} />
    </div>
  );
}
