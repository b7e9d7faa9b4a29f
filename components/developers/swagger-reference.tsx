"use client";

import { useState, type ComponentType } from "react";
import SwaggerUI from "swagger-ui-react";
import "swagger-ui-react/swagger-ui.css";

/** What Swagger UI hands to a layout. */
interface LayoutProps {
  getComponent(name: string, connected?: boolean): ComponentType;
}

/** The operations and no more: its own layout has a second main landmark, and a heading and a server to choose that the page spares. */
function OperationsOnly({ getComponent }: LayoutProps) {
  const [Drawings, Errors, Operations] = [getComponent("SvgAssets"), getComponent("errors", true), getComponent("operations", true)];
  return (
    <div className="swagger-ui">
      <Drawings />
      <Errors />
      <div className="wrapper">
        <Operations />
      </div>
    </div>
  );
}

const plugins = [() => ({ components: { OperationsOnly } })];

/** Every operation of the document, tried on the site it is read on. */
export function SwaggerReference({ loading }: { loading: string }) {
  const [ready, setReady] = useState(false);
  return (
    <>
      {ready ? null : <p role="status">{loading}</p>}
      <SwaggerUI
        url="/api/v1/openapi.json"
        plugins={plugins}
        layout="OperationsOnly"
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
