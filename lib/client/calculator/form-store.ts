import type { LengthUnit, Precision } from "@/calculators/length";
import { defaultPrecision, formFromQuery, queryFromForm, inUnit, type FormState, type IsLength } from "./form-fields";

/** Safari allows 100 address changes in 30 s; a pause of this many milliseconds after the last key stays far below. */
const addressPause = 400;

/**
 * What is typed on a calculator's page, held outside React and mirrored into the address, so that reload, copy and
 * language switch keep it. The server and the first client render see `initial`.
 */
export function createFormStore(initial: FormState) {
  let state = initial;
  let timer: ReturnType<typeof setTimeout> | undefined;
  let adopted: { unit: LengthUnit; precision: Precision } | null = null;
  const listeners = new Set<() => void>();

  function writeAddress(): void {
    clearTimeout(timer);
    const query = queryFromForm(state).toString();
    const address = `${window.location.pathname}${query === "" ? "" : `?${query}`}${window.location.hash}`;
    // Past Next's own replaceState, which would render the router again at every pause in typing.
    History.prototype.replaceState.call(window.history, window.history.state, "", address);
  }

  function change(next: FormState): void {
    state = next;
    for (const listener of listeners) listener();
    clearTimeout(timer);
    timer = setTimeout(writeAddress, addressPause);
  }

  return {
    get: () => state,
    getInitial: () => initial,
    change,
    /** Writes the address now: before leaving it by a link, or copying it. */
    flush: writeAddress,
    /** Takes the device's unit and precision. The first time, an address's own precision stands while it is of the device's system. */
    adopt(unit: LengthUnit, precision: Precision, isLength: IsLength): void {
      if (adopted?.unit === unit && adopted.precision === precision) return;
      const fromAddress = adopted === null && state.precision !== defaultPrecision && state.precision.endsWith("mm") === precision.endsWith("mm");
      adopted = { unit, precision };
      const next = inUnit(state, unit, fromAddress ? state.precision : precision, isLength);
      if (next.unit !== state.unit || next.precision !== state.precision) change(next);
    },
    subscribe(listener: () => void): () => void {
      if (listeners.size === 0) {
        const search = new URLSearchParams(window.location.search);
        if (search.size > 0 && search.toString() !== queryFromForm(state).toString()) {
          state = formFromQuery(search);
          queueMicrotask(listener);
        }
        window.addEventListener("pagehide", writeAddress);
      }
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
        if (listeners.size > 0) return;
        adopted = null; // whoever subscribes next reads the address again, and takes the device's settings again
        clearTimeout(timer);
        window.removeEventListener("pagehide", writeAddress);
      };
    },
  };
}

export type FormStore = ReturnType<typeof createFormStore>;
