import type { JointWindows } from "../joints/joint-chains";
import type { BoardKind, StretchToCut } from "./board-problem";

/** One way to joint a stretch, with the joints put somewhere to start from. */
export interface StartingJoints {
  way: number;
  joints: readonly number[];
  /** Length of pieces that use a whole board up, uncut. */
  whole: number;
}

/**
 * Places to start the joints of a stretch from: pieces as long as whole boards from either end, joints in the middle of
 * their windows, and at either side. Best first: the most that whole boards give.
 */
export function startingJoints(stretch: StretchToCut, kinds: readonly BoardKind[], kerf: number): StartingJoints[] {
  const usable = kinds.map((kind) => kind.capacity - kerf).sort((a, b) => b - a);
  const longest = usable[0]!;
  const starts = new Map<string, StartingJoints>();
  stretch.ways.forEach((windows, way) => {
    const bounds = withinBoards(windows, stretch.from, stretch.to, longest);
    if (bounds === null) return;
    const choices: ((low: number, high: number, before: number) => number)[] = [
      (low, high, before) => usable.map((length) => before + length).find((at) => low <= at && at <= high) ?? Math.floor((low + high) / 2),
      (low, high, before) => usable.map((length) => before + length).find((at) => low <= at && at <= high) ?? high,
      (low, high) => Math.floor((low + high) / 2),
      (low) => low,
      (_, high) => high,
    ];
    for (const choose of choices) add(forward(bounds, stretch.from, longest, choose));
    add(backward(bounds, stretch.to, usable));
    function add(joints: number[] | null): void {
      if (joints === null || starts.has(joints.join())) return;
      const ends = [stretch.from, ...joints, stretch.to];
      const lengths = ends.slice(1).map((end, index) => end - ends[index]!);
      starts.set(joints.join(), { way, joints, whole: lengths.reduce((sum, length) => sum + (usable.includes(length) ? length : 0), 0) });
    }
  });
  // A crew begins with the whole board: of equals the one with the longer first piece.
  return [...starts.values()].sort((a, b) => b.whole - a.whole || (b.joints[0] ?? 0) - (a.joints[0] ?? 0));
}

type Bounds = readonly (readonly [number, number])[];

/** The windows, narrowed until each joint leaves pieces that a board can hold; null when they cannot. */
function withinBoards(windows: JointWindows, from: number, to: number, longest: number): Bounds | null {
  const bounds = windows.map(([low, high]): [number, number] => [low, high]);
  let before = from;
  for (const bound of bounds) before = bound[1] = Math.min(bound[1], before + longest);
  let after = to;
  for (const bound of [...bounds].reverse()) after = bound[0] = Math.max(bound[0], after - longest);
  const last = bounds.at(-1)?.[1] ?? from;
  return bounds.every(([low, high]) => low <= high) && to - last <= longest ? bounds : null;
}

function forward(bounds: Bounds, from: number, longest: number, choose: (low: number, high: number, before: number) => number): number[] | null {
  const joints: number[] = [];
  let before = from;
  for (const [low, high] of bounds) {
    const reach = Math.min(high, before + longest);
    if (low > reach) return null;
    before = choose(low, reach, before);
    joints.push(before);
  }
  return joints;
}

function backward(bounds: Bounds, to: number, usable: readonly number[]): number[] | null {
  const joints: number[] = [];
  let after = to;
  for (const [low, high] of [...bounds].reverse()) {
    const least = Math.max(low, after - usable[0]!);
    if (least > high) return null;
    after = usable.map((length) => after - length).find((at) => least <= at && at <= high) ?? least;
    joints.unshift(after);
  }
  return joints;
}
