import type { BoardPlan, BoardProblem } from "./boards/board-problem";
import { easiestPlace } from "./joints/place-anchors";

/**
 * The same plan with every joint on the coarsest graduation that its window and the room left on its two boards allow:
 * a crew marks 9' 4" sooner than 9' 3 57/64". A piece that uses its board up to the last bit keeps its joint.
 */
export function polishedJoints({ kinds, stretches, kerf }: BoardProblem, plan: BoardPlan, graduations: readonly number[]): number[][] {
  const boardOf = new Map<number, number>();
  plan.boards.forEach((board, index) => board.pieces.forEach((piece) => boardOf.set(piece, index)));
  const joints = plan.joints.map((list) => [...list]);
  const firstPiece: number[] = [];
  let count = 0;
  joints.forEach((list, index) => {
    firstPiece[index] = count;
    count += list.length + 1;
  });
  const room = plan.boards.map((board) => kinds[board.kind]!.capacity);
  stretches.forEach((stretch, index) => {
    const ends = [stretch.from, ...joints[index]!, stretch.to];
    ends.slice(1).forEach((end, place) => (room[boardOf.get(firstPiece[index]! + place)!]! -= end - ends[place]! + kerf));
  });
  stretches.forEach((stretch, index) => {
    const windows = stretch.ways[plan.ways[index]!]!;
    windows.forEach(([low, high], place) => {
      const left = boardOf.get(firstPiece[index]! + place)!;
      const right = boardOf.get(firstPiece[index]! + place + 1)!;
      if (left !== right && (room[left] === 0 || room[right] === 0)) return;
      const at = joints[index]![place]!;
      const before = place === 0 ? stretch.from : joints[index]![place - 1]!;
      const after = place === windows.length - 1 ? stretch.to : joints[index]![place + 1]!;
      const least = Math.max(low, before + 1, left === right ? -Infinity : at - room[right]!);
      const most = Math.min(high, after - 1, left === right ? Infinity : at + room[left]!);
      const better = easiestPlace([[least, most]], at, graduations);
      if (left !== right) {
        room[left]! -= better - at;
        room[right]! += better - at;
      }
      joints[index]![place] = better;
    });
  });
  return joints;
}
