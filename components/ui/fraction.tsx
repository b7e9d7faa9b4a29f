/**
 * A built fraction. The stack is drawn from attributes and hidden from readers; the plain `7/16` beside it is what a screen
 * reader says, what is copied, and what a test reads.
 */
export function Fraction({ top, bottom }: { top: string | number; bottom: string | number }) {
  return (
    <span className="fraction">
      <span className="fraction-stack" aria-hidden="true" data-top={top} data-bottom={bottom} />
      <span className="sr-only">{`${top}/${bottom}`}</span>
    </span>
  );
}
