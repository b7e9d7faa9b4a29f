/**
 * A judge of its own for the property tests: whole numbers of half inches, loops and nothing else. It shares no code with
 * the calculators and knows the rule only by the figures handed to it.
 */
export interface JudgedBolt {
  station: number;
  offset: number | null;
  slabOffset: number | null;
  projection: number | null;
  diameter: number;
  engineered: boolean;
}

export interface JudgedWall {
  pieces: { from: number; to: number }[];
  bolts: JudgedBolt[];
  plateWidth: number | null;
  members: number[];
  memberReach: number;
  projection: number;
  figures: { spacing: number | null; endMinimum: number | null; endMaximum: number | null; count: number | null; third: boolean; cover: number | null; diameter: number | null };
}

/** Every violation as `code piece bolt`, sorted; pieces and bolts by their place in the input, - for none. */
export function judgeByHand({ pieces, bolts, plateWidth, members, memberReach, projection, figures }: JudgedWall): string[] {
  const found: string[] = [];
  const counted: number[] = [];
  for (let b = 0; b < bolts.length; b += 1) {
    if (bolts[b]!.engineered) continue;
    let repeated = false;
    for (const other of counted) if (bolts[other]!.station === bolts[b]!.station && (bolts[other]!.offset === null || bolts[b]!.offset === null || bolts[other]!.offset === bolts[b]!.offset)) repeated = true;
    if (!repeated) counted.push(b);
  }
  const order = pieces.map((_, p) => p).sort((a, b) => pieces[a]!.from - pieces[b]!.from);
  const home = new Map<number, number>();
  for (const b of counted) for (const p of [...order].reverse()) if (bolts[b]!.station >= pieces[p]!.from && bolts[b]!.station <= pieces[p]!.to) home.set(b, p);
  const along = counted.filter((b) => home.has(b)).sort((a, b) => bolts[a]!.station - bolts[b]!.station || a - b);

  for (const p of order) {
    const mine = along.filter((b) => home.get(b) === p);
    if (figures.count !== null && mine.length < figures.count) found.push(`too-few ${p} -`);
    for (const b of mine) {
      const distance = Math.min(bolts[b]!.station - pieces[p]!.from, pieces[p]!.to - bolts[b]!.station);
      if (figures.endMinimum !== null && distance < figures.endMinimum) found.push(`near-end ${p} ${b}`);
    }
    if (figures.endMaximum !== null && mine.length > 0) {
      if (bolts[mine[0]!]!.station - pieces[p]!.from > figures.endMaximum) found.push(`far-end ${p} ${mine[0]}`);
      if (pieces[p]!.to - bolts[mine.at(-1)!]!.station > figures.endMaximum) found.push(`far-end ${p} ${mine.at(-1)}`);
    }
  }
  const touches = (a: number, b: number) => {
    for (let k = order.indexOf(a); k < order.indexOf(b); k += 1) if (pieces[order[k]!]!.to !== pieces[order[k + 1]!]!.from) return false;
    return true;
  };
  for (let k = 0; k + 1 < along.length; k += 1) {
    const [a, b] = [along[k]!, along[k + 1]!];
    if (figures.spacing !== null && touches(home.get(a)!, home.get(b)!) && bolts[b]!.station - bolts[a]!.station > figures.spacing) found.push(`spacing ${home.get(a)} ${a}`);
  }
  for (const b of counted) {
    const bolt = bolts[b]!;
    const p = home.get(b);
    if (p === undefined) {
      found.push(`off-piece - ${b}`);
      continue;
    }
    if (figures.third && plateWidth !== null && bolt.offset !== null && (3 * bolt.offset < plateWidth || 3 * bolt.offset > 2 * plateWidth)) found.push(`middle-third ${p} ${b}`);
    if (figures.cover !== null && bolt.slabOffset !== null && 2 * bolt.slabOffset - bolt.diameter < 2 * figures.cover) found.push(`slab-edge ${p} ${b}`);
    if (members.some((member) => Math.abs(member - bolt.station) < memberReach)) found.push(`under-joist ${p} ${b}`);
    if (bolt.projection !== null && bolt.projection < projection) found.push(`too-short ${p} ${b}`);
    if (figures.diameter !== null && bolt.diameter < figures.diameter) found.push(`diameter ${p} ${b}`);
  }
  return found.sort();
}

/** Tries every set of added bolts on whole marks, smallest sets first: the least number that satisfies, or null up to `most`. */
export function fewestByTrying(wall: { pieces: { from: number; to: number }[]; standing: number[]; marks: number[]; spacing: number; endMaximum: number; count: number }, most: number): number | null {
  const { pieces, standing, marks, spacing, endMaximum, count } = wall;
  const satisfied = (added: readonly number[]) => {
    const all = [...standing, ...added].sort((a, b) => a - b);
    for (const { from, to } of pieces) {
      const mine = all.filter((bolt) => bolt > from && bolt < to);
      if (mine.length < count || mine[0]! - from > endMaximum || to - mine.at(-1)! > endMaximum) return false;
    }
    for (let k = 0; k + 1 < all.length; k += 1) if (all[k + 1]! - all[k]! > spacing) return false;
    return true;
  };
  const attempt = (added: readonly number[], start: number, left: number): boolean => {
    if (left === 0) return satisfied(added);
    for (let k = start; k < marks.length; k += 1) if (attempt([...added, marks[k]!], k + 1, left - 1)) return true;
    return false;
  };
  for (let size = 0; size <= most; size += 1) if (attempt([], 0, size)) return size;
  return null;
}
