/** Runs after the next paint: a frame, then a task of its own. */
function afterPaint(run: () => void): void {
  requestAnimationFrame(() => setTimeout(run, 0));
}

/**
 * Texts typed since the form was last told. A key press paints its own field at once; the form, whose every part would
 * render, is told after that paint, or before anything else that reads it.
 */
export function createTypedText(tell: (fields: Record<string, string>) => void) {
  let waiting: Record<string, string> | null = null;

  function flush(): void {
    if (waiting === null) return;
    const fields = waiting;
    waiting = null;
    tell(fields);
  }

  return {
    type(field: string, text: string): void {
      if (waiting === null) afterPaint(flush);
      waiting = { ...waiting, [field]: text };
    },
    flush,
  };
}
