import { planSill, platesInput, type PlatesAnswer } from "@/calculators/plates";
import { CalculationError, issuesOf, type Answered } from "@/calculators/schema";

/** What the page asks: a request as the API takes it, and how many seconds may go into it. */
export interface PlanRequest {
  key: string;
  request: unknown;
  seconds: number;
}

export type PlanMessage =
  | { key: string; kind: "progress"; stage: 1 | 2; share: number }
  /** An answer; `final` when no better one will follow. */
  | { key: string; kind: "answer"; answered: Answered<PlatesAnswer>; final: boolean }
  /** No better one was found: the answer that was told stands. */
  | { key: string; kind: "stands" };

/** A first plan comes soon; then the search begins anew with four times the time, until it is proved best or the time is used. */
const firstSeconds = 0.25;
const progressEvery = 80;

const tell = (message: PlanMessage) => postMessage(message);

addEventListener("message", ({ data }: MessageEvent<PlanRequest>) => {
  const { key, request, seconds } = data;
  const parsed = platesInput.safeParse(request);
  if (!parsed.success) return tell({ key, kind: "answer", answered: { answer: null, issues: issuesOf(parsed.error) }, final: true });
  let told = 0;
  let best = "";
  for (let time = Math.min(firstSeconds, seconds); ; time = Math.min(seconds, time * 4)) {
    const isLast = time >= seconds;
    try {
      const answer = planSill(
        { ...parsed.data, timeLimit: time },
        {
          onProgress: ({ stage, share }) => {
            if (performance.now() - told < progressEvery) return;
            told = performance.now();
            tell({ key, kind: "progress", stage, share: share * (time / seconds) });
          },
        },
      );
      const final = isLast || answer.ended !== "time";
      // A whole house is much to hand over and to draw: only what is new goes.
      const news = JSON.stringify([answer.cost, answer.totals.boards, answer.boardsProved, answer.provedBound]);
      if (news !== best) tell({ key, kind: "answer", answered: { answer, issues: [] }, final });
      else if (final) tell({ key, kind: "stands" });
      best = news;
      if (final) return;
    } catch (error) {
      if (!(error instanceof CalculationError)) throw error;
      return tell({ key, kind: "answer", answered: { answer: null, issues: error.issues }, final: true });
    }
  }
});
