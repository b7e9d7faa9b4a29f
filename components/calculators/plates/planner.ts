import type { PlatesAnswer } from "@/calculators/plates";
import type { Answered, Operation } from "@/calculators/schema";
import { preparePlates } from "./plates-fields";
import type { PlanMessage, PlanRequest } from "./plates-worker";

type Prepare = (input: Record<string, unknown>) => Record<string, unknown>;

/** How far the search is; changes many times a second. */
export interface PlanProgressState {
  stage: 1 | 2;
  share: number;
}

/** What the page is drawn from; changes only when a search begins, answers or ends. */
export interface PlannerState {
  /** A plan is being looked for: the first for what is typed, or a better one. */
  busy: boolean;
  /** The last answer there was, to stay on screen while the next is worked out. */
  last: PlatesAnswer | null;
  /** A new one whenever an answer has come, so that the form asks again. */
  prepare: Prepare;
}

const quietMilliseconds = 150;
const nothingYet: Answered<never> = { answer: null, issues: [] };
const defaultSeconds = 4;

/**
 * Plans in a worker, so that the page never waits: the newest request alone is worked on, a better answer replaces the first, and
 * `stop` keeps the best so far. Where there is no worker the plan is made here, in a short time.
 */
export function createPlanner() {
  let state: PlannerState = { busy: false, last: null, prepare: (input) => preparePlates(input) };
  const initial = state;
  let progress: PlanProgressState = { stage: 1, share: 0 };
  const listeners = new Set<() => void>();
  let worker: Worker | null = null;
  let working = false;
  let wanted: string | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const answers = new Map<string, Answered<PlatesAnswer>>();

  function set(next: Partial<PlannerState>): void {
    state = { ...state, ...next };
    tell();
  }

  function tell(): void {
    for (const listener of listeners) listener();
  }

  function drop(): void {
    worker?.terminate();
    worker = null;
    working = false;
  }

  function keep(key: string, answered: Answered<PlatesAnswer>, final: boolean): void {
    if (key !== wanted) return;
    answers.clear();
    answers.set(key, answered);
    set({ busy: !final, last: answered.answer, prepare: (input) => preparePlates(input) });
  }

  function hear({ data }: MessageEvent<PlanMessage>): void {
    if (data.kind === "answer") {
      if (data.final) working = false;
      keep(data.key, data.answered, data.final);
    } else if (data.kind === "stands") {
      working = false;
      if (data.key === wanted) set({ busy: false });
    } else if (data.key === wanted) {
      progress = { stage: data.stage, share: data.share };
      tell();
    }
  }

  async function planHere(key: string, request: unknown): Promise<void> {
    const { loaded } = await import("./core");
    keep(key, loaded.answerTo(loaded.operation, request), true);
  }

  function start(key: string, request: unknown, seconds: number): void {
    if (working) drop();
    progress = { stage: 1, share: 0 };
    set({ busy: true });
    try {
      if (worker === null) {
        worker = new Worker(new URL("./plates-worker.ts", import.meta.url), { type: "module" });
        worker.addEventListener("message", hear);
        worker.addEventListener("error", () => {
          drop();
          if (wanted === key && !answers.has(key)) void planHere(key, request);
        });
      }
      working = true;
      worker.postMessage({ key, request, seconds } satisfies PlanRequest);
    } catch {
      drop();
      void planHere(key, request);
    }
  }

  return {
    get: () => state,
    getInitial: () => initial,
    progress: () => progress,
    subscribe(listener: () => void) {
      listeners.add(listener);
      return () => {
        listeners.delete(listener);
        if (listeners.size > 0) return;
        clearTimeout(timer);
        drop();
      };
    },
    /** The best plan so far is taken; no better one is looked for. */
    stop(): void {
      drop();
      set({ busy: false });
    },
    /** What the form asks instead of the operation itself: the answer when it is there, else nothing yet. */
    loaded: {
      operation: null as unknown as Operation,
      answerTo: (_: Operation, request: unknown): Answered<unknown> => {
        const key = JSON.stringify(request);
        const known = answers.get(key);
        if (known !== undefined) return known;
        if (key !== wanted) {
          wanted = key;
          clearTimeout(timer);
          const asked = Number((request as { timeLimit?: unknown }).timeLimit);
          timer = setTimeout(() => start(key, request, asked > 0 && asked <= 60 ? asked : defaultSeconds), quietMilliseconds);
        }
        return nothingYet;
      },
    },
  };
}

export type Planner = ReturnType<typeof createPlanner>;
