import type { ReactNode } from "react";
import { Disclosure } from "./disclosure";

/** "Show me": where each hand stands and why, as numbered steps with a drawing of the work. `steps` come from the page's messages. */
export function ShowMe({ title, drawing, steps }: { title: ReactNode; drawing?: ReactNode; steps: readonly ReactNode[] }) {
  return (
    <Disclosure summary={title} id="show-me">
      {drawing}
      <ol>
        {steps.map((step, index) => (
          <li key={index}>{step}</li>
        ))}
      </ol>
    </Disclosure>
  );
}
