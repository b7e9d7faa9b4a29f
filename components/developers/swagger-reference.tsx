"use client";

import { useState } from "react";
import SwaggerUI from "swagger-ui-react";
import "swagger-ui-react/swagger-ui.css";

/** Every operation of the document, tried on the site it is read on. */
export function SwaggerReference({ loading }: { loading: string }) {
  const [ready, setReady] = useState(false);
  return (
    <>
      {ready ? null : <p role="status">{loading}</p>}
      <SwaggerUI
        url="/api/v1/openapi.json"
        docExpansion="list"
        defaultModelsExpandDepth={-1}
        defaultModelExpandDepth={2}
        supportedSubmitMethods={["get", "post"]}
        tryItOutEnabled
        persistAuthorization={false}
        onComplete={() => setReady(true)}
      />
    </>
  );
}
