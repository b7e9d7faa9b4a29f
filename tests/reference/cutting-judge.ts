import loadHighs from "highs";
import type { BoardProblem } from "@/calculators/plates/boards/board-problem";

/**
 * The cutting problem as a mixed integer program, for HiGHS to solve: which piece on which board, which board of which
 * kind, and where each joint stands within its window. One program for each combination of ways of jointing.
 * It shares nothing with the product's search.
 *
 * A piece's share of a board is a variable of its own, at least the piece's length when it lies there and at least
 * nothing when it does not, so that the program is linear although lengths are free.
 */
export async function bestByHighs({ kinds, stretches, kerf }: BoardProblem): Promise<{ cost: number; boards: number } | null> {
  const highs = await loadHighs();
  const combinations = stretches.reduce<number[][]>((all, stretch) => all.flatMap((chosen) => stretch.ways.map((_, way) => [...chosen, way])), [[]]);
  let best: { cost: number; boards: number } | null = null;
  for (const ways of combinations) {
    const pieces = ways.reduce((sum, way, index) => sum + stretches[index]!.ways[way]!.length + 1, 0);
    const found = highs.solve(program({ kinds, stretches, kerf }, ways, pieces), { mip_rel_gap: 0, mip_abs_gap: 0 });
    if (found.Status !== "Optimal") continue;
    const weight = Math.round(found.ObjectiveValue);
    const answer = { cost: Math.floor(weight / (pieces + 1)), boards: weight % (pieces + 1) };
    if (best === null || answer.cost < best.cost || (answer.cost === best.cost && answer.boards < best.boards)) best = answer;
  }
  return best;
}

function program({ kinds, stretches, kerf }: BoardProblem, ways: readonly number[], pieces: number): string {
  const boards = Array.from({ length: pieces }, (_, board) => board);
  const rows: string[] = [];
  const bounds: string[] = [];
  const binaries: string[] = [];
  const longest = Math.max(...kinds.map((kind) => kind.capacity));
  const objective = boards.flatMap((board) => kinds.map((kind, index) => `${kind.cost * (pieces + 1) + 1} y${board}_${index}`));
  let piece = 0;
  stretches.forEach((stretch, index) => {
    const windows = stretch.ways[ways[index]!]!;
    windows.forEach(([low, high], joint) => bounds.push(`${low} <= p${index}_${joint} <= ${high}`));
    for (let place = 0; place <= windows.length; place += 1, piece += 1) {
      // length = end − start, each a joint or an end of the stretch
      const end = place === windows.length ? { term: "", value: stretch.to } : { term: `p${index}_${place}`, value: 0 };
      const start = place === 0 ? { term: "", value: stretch.from } : { term: `p${index}_${place - 1}`, value: 0 };
      for (const board of boards) {
        // share ≥ length + kerf − M (1 − x)
        rows.push(`s${piece}_${board} ${end.term === "" ? "" : `- ${end.term}`} ${start.term === "" ? "" : `+ ${start.term}`} - ${4 * longest} x${piece}_${board} >= ${end.value - start.value + kerf - 4 * longest}`);
        binaries.push(`x${piece}_${board}`);
      }
      rows.push(`${boards.map((board) => `x${piece}_${board}`).join(" + ")} = 1`);
    }
  });
  for (const board of boards) {
    rows.push(`${Array.from({ length: pieces }, (_, at) => `s${at}_${board}`).join(" + ")} ${kinds.map((kind, index) => `- ${kind.capacity} y${board}_${index}`).join(" ")} <= 0`);
    rows.push(`${kinds.map((_, index) => `y${board}_${index}`).join(" + ")} <= 1`);
    kinds.forEach((_, index) => binaries.push(`y${board}_${index}`));
  }
  kinds.forEach((kind, index) => {
    if (Number.isFinite(kind.count)) rows.push(`${boards.map((board) => `y${board}_${index}`).join(" + ")} <= ${kind.count}`);
  });
  return `Minimize\n obj: ${objective.join(" + ")}\nSubject To\n${rows.map((row, index) => ` r${index}: ${row}`).join("\n")}\nBounds\n${bounds.map((bound) => ` ${bound}`).join("\n")}\nBinary\n ${binaries.join("\n ")}\nEnd\n`;
}
