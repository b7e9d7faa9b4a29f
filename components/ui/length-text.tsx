import { Fragment } from "react";
import { Fraction } from "./fraction";

const fractions = /(\s?)(\d+)\/(\d+)/;

/** A printed length such as `28' 7 1/2"`, in the figures' type with its fraction built. Works in server and client components. */
export function LengthText({ text, className = "" }: { text: string; className?: string }) {
  const parts = text.split(fractions);
  return (
    <span className={`length ${className}`}>
      {parts.map((part, index) => {
        if (index % 4 === 0) return <Fragment key={index}>{part}</Fragment>;
        if (index % 4 !== 2) return null;
        // The space before a fraction is in the stack's margin for the eye, and kept for readers.
        return (
          <Fragment key={index}>
            {parts[index - 1] === "" ? null : <span className="sr-only"> </span>}
            <Fraction top={part} bottom={parts[index + 1] ?? ""} />
          </Fragment>
        );
      })}
    </span>
  );
}
