import type { BoardKind, BoardPlan } from "./board-problem";

/** A joint that may slide: what one of its pieces gains the other loses. */
export interface SlidingJoint {
  left: number;
  right: number;
  low: number;
  high: number;
  at: number;
}

/**
 * Pieces on boards while a plan is being improved. A board may be overfull for a time; `settle` slides joints so that
 * as little as possible hangs over, `isSound` says whether nothing does.
 */
export class Packing {
  readonly sizes: number[];
  readonly joints: SlidingJoint[];
  readonly boardOf: number[];
  kinds: number[];
  members: number[][];
  loads: number[];

  constructor(
    readonly stock: readonly BoardKind[],
    sizes: readonly number[],
    joints: readonly SlidingJoint[],
    boards: BoardPlan["boards"],
  ) {
    this.sizes = [...sizes];
    this.joints = joints.map((joint) => ({ ...joint }));
    this.kinds = boards.map((board) => board.kind);
    this.members = boards.map((board) => [...board.pieces]);
    this.boardOf = new Array<number>(sizes.length).fill(-1);
    this.members.forEach((pieces, board) => pieces.forEach((piece) => (this.boardOf[piece] = board)));
    this.loads = this.members.map((pieces) => pieces.reduce((sum, piece) => sum + sizes[piece]!, 0));
  }

  copy(): Packing {
    return new Packing(this.stock, this.sizes, this.joints, this.boards());
  }

  boards(): { kind: number; pieces: number[] }[] {
    return this.kinds.map((kind, board) => ({ kind, pieces: [...this.members[board]!] }));
  }

  capacity(board: number): number {
    return this.stock[this.kinds[board]!]!.capacity;
  }

  over(board: number): number {
    return Math.max(0, this.loads[board]! - this.capacity(board));
  }

  totalOver(): number {
    let sum = 0;
    for (let board = 0; board < this.kinds.length; board += 1) sum += this.over(board);
    return sum;
  }

  isSound(): boolean {
    return this.loads.every((load, board) => load <= this.capacity(board));
  }

  move(piece: number, to: number): void {
    const from = this.boardOf[piece]!;
    this.members[from]!.splice(this.members[from]!.indexOf(piece), 1);
    this.members[to]!.push(piece);
    this.loads[from]! -= this.sizes[piece]!;
    this.loads[to]! += this.sizes[piece]!;
    this.boardOf[piece] = to;
  }

  /** Takes a board away; its pieces go where the most room is, fitting or not. */
  remove(board: number): void {
    const pieces = [...this.members[board]!].sort((a, b) => this.sizes[b]! - this.sizes[a]!);
    for (const piece of pieces) {
      let best = -1;
      for (let other = 0; other < this.kinds.length; other += 1) {
        if (other !== board && (best === -1 || this.capacity(other) - this.loads[other]! > this.capacity(best) - this.loads[best]!)) best = other;
      }
      this.move(piece, best);
    }
    const last = this.kinds.length - 1;
    if (board !== last) {
      this.kinds[board] = this.kinds[last]!;
      this.members[board] = this.members[last]!;
      this.loads[board] = this.loads[last]!;
      for (const piece of this.members[board]!) this.boardOf[piece] = board;
    }
    this.kinds.pop();
    this.members.pop();
    this.loads.pop();
  }

  /**
   * Slides joints until nothing more can be moved off an overfull board: a largest flow, overfull boards giving, boards
   * with room taking, a joint letting through what its window allows. True when no board is overfull.
   */
  settle(): boolean {
    if (this.joints.length === 0) return this.isSound();
    const around = this.jointsByBoard();
    for (let board = 0; board < this.kinds.length; board += 1) while (this.over(board) > 0) if (!this.shiftFrom(board, around)) break;
    return this.isSound();
  }

  private jointsByBoard(): number[][] {
    const around: number[][] = this.kinds.map(() => []);
    this.joints.forEach((joint, index) => {
      const left = this.boardOf[joint.left]!;
      const right = this.boardOf[joint.right]!;
      if (left === right) return;
      around[left]!.push(index);
      around[right]!.push(index);
    });
    return around;
  }

  /** One shortest chain of slides from an overfull board to one with room. */
  private shiftFrom(start: number, around: readonly number[][]): boolean {
    const cameBy: { joint: number; from: number }[] = new Array(this.kinds.length);
    const seen = new Uint8Array(this.kinds.length);
    seen[start] = 1;
    const queue = [start];
    for (let head = 0; head < queue.length; head += 1) {
      const board = queue[head]!;
      for (const index of around[board]!) {
        const joint = this.joints[index]!;
        const isLeft = this.boardOf[joint.left] === board;
        const next = isLeft ? this.boardOf[joint.right]! : this.boardOf[joint.left]!;
        if (seen[next] === 1 || (isLeft ? joint.at - joint.low : joint.high - joint.at) <= 0) continue;
        seen[next] = 1;
        cameBy[next] = { joint: index, from: board };
        if (this.loads[next]! < this.capacity(next)) {
          this.shiftAlong(start, next, cameBy);
          return true;
        }
        queue.push(next);
      }
    }
    return false;
  }

  private shiftAlong(start: number, end: number, cameBy: readonly { joint: number; from: number }[]): void {
    let amount = Math.min(this.over(start), this.capacity(end) - this.loads[end]!);
    for (let board = end; board !== start; board = cameBy[board]!.from) {
      const { joint: index, from } = cameBy[board]!;
      const joint = this.joints[index]!;
      amount = Math.min(amount, this.boardOf[joint.left] === from ? joint.at - joint.low : joint.high - joint.at);
    }
    for (let board = end; board !== start; board = cameBy[board]!.from) {
      const { joint: index, from } = cameBy[board]!;
      const joint = this.joints[index]!;
      this.slide(index, this.boardOf[joint.left] === from ? -amount : amount);
    }
  }

  slide(index: number, by: number): void {
    const joint = this.joints[index]!;
    joint.at += by;
    this.sizes[joint.left]! += by;
    this.sizes[joint.right]! -= by;
    this.loads[this.boardOf[joint.left]!]! += by;
    this.loads[this.boardOf[joint.right]!]! -= by;
  }
}
