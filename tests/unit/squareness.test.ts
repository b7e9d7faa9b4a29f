import { describe, expect, test } from "vitest";
import fc from "fast-check";
import { presets, squarenessOperation, type SquarenessAnswer } from "@/calculators/squareness";
import { triangleAt } from "@/calculators/squareness/tolerance/allow";
import { answerTo } from "@/calculators/schema";
import { kentRows, racked, rectangle, trapezoid, triangleRows } from "@/tests/reference/squareness-rows";

const ask = (request: object): SquarenessAnswer => {
  const { answer, issues } = answerTo(squarenessOperation, request);
  if (answer === null) throw new Error(JSON.stringify(issues));
  return squarenessOperation.answer.parse(answer);
};
const issuesFor = (request: object) => answerTo(squarenessOperation, request).issues.map(({ pointer, code }) => `${pointer} ${code}`);
const between = ([x, y]: readonly [number, number], [u, v]: readonly [number, number]) => Math.hypot(u - x, v - y);

describe("two sides and two diagonals", () => {
  test("S07: diagonals 1.5 in apart on 24 by 28 ft", () => {
    const answer = ask({ length: racked.length, width: racked.width, diagonals: { ac: racked.ac, bd: racked.bd } });
    expect(90 - answer.corners.A.angleDegrees).toBeCloseTo(racked.cornerErrorDegrees, 3);
    expect(answer.rack.distance.in).toBeCloseTo(racked.over24, 3);
    expect(Math.abs((answer.rack.distance.in * 336) / 288 - racked.over28)).toBeLessThan(1e-3); // the row's tolerance
    expect([answer.shape, answer.rack.toward, answer.longer]).toEqual(["racked", "D", "ac"]);
  });

  test("the rack is (AC² − BD²)/(4·AB), exact, and the difference too", () => {
    const answer = ask({ length: "28 ft", width: "22 ft", diagonals: { ac: "428 9/16", bd: "428 1/16" }, burn: "1 in" });
    // python3: Fraction(((427*16+9)**2 - (427*16+1)**2), 256) / (4 * 336)
    expect([answer.difference.exact, answer.rack.distance.exact]).toEqual(["1/2", "2279/7168"]);
    expect([answer.rack.distance.text, answer.rack.toward, answer.target.diagonal.text, answer.target.reading.in - answer.target.diagonal.in]).toEqual(["5/16\"", "D", "35' 7 5/16\"", 1]);
  });

  test("BD longer: CD goes toward C; none longer: nowhere", () => {
    const sizes = { length: "40 ft", width: "30 ft" };
    expect(ask({ ...sizes, diagonals: { ac: "599 1/2", bd: "600 1/2" } }).rack.toward).toBe("C");
    const square = ask({ ...sizes, diagonals: { ac: "600", bd: "600" } });
    expect([square.rack.toward, square.rack.distance.exact, square.target.diagonal.exact, square.shape]).toEqual([null, "0", "600", "square"]);
  });

  test("moving the far side as told makes the figure's diagonals equal", () => {
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 900 }), fc.integer({ min: 100, max: 900 }), fc.double({ min: -0.01, max: 0.01, noNaN: true }), (length, width, cosine) => {
        const diagonal = (sign: number) => Math.sqrt(length ** 2 + width ** 2 + sign * 2 * length * width * cosine);
        const answer = ask({ length, width, diagonals: { ac: diagonal(1), bd: diagonal(-1) } });
        const shift = answer.rack.distance.in * (answer.rack.toward === "D" ? -1 : answer.rack.toward === "C" ? 1 : 0);
        const { C, D } = answer.corners;
        expect(between([0, 0], [C.x + shift, C.y])).toBeCloseTo(between([length, 0], [D.x + shift, D.y]), 6);
        expect(answer.closureIn).toBeLessThan(1e-6);
      }),
    );
  });

  test("taper is unknown, and the readings say that they cannot prove it", () => {
    const answer = ask({ length: 336, width: 288, diagonals: { ac: 442.5, bd: 442.5 } });
    expect([answer.taper, answer.readings.cd, answer.readings.ab.adjusted]).toEqual([null, null, null]);
    expect(answer.proves).toEqual(["rack-if-sides-match", "sides-agree", "taper-unknown", "scale-unchecked"]);
  });

  test("diagonals that no rectangle of these sides comes near contradict them", () => {
    // √(336² + 288²) = 442.538; the mean diagonal may be 2.45/8 in off
    expect(ask({ length: 336, width: 288, diagonals: { ac: 442.84, bd: 442.84 } }).verdict).toBeNull();
    const off = ask({ length: 336, width: 288, diagonals: { ac: 442.85, bd: 442.85 } });
    expect([off.verdict, off.proves[1]]).toEqual(["contradictory", "sides-disagree"]);
    expect(ask({ length: 336, width: 288, diagonals: { ac: 442.85, bd: 442.85 }, readingError: "1/4" }).verdict).toBeNull();
  });

  test("sides may be readings as well, burned like the diagonals; sizes never are", () => {
    const asSizes = ask({ length: 336, width: 288, diagonals: { ac: 443.5, bd: 443.5 }, burn: "1" });
    const asReadings = ask({ sides: { ab: 337, da: 289 }, diagonals: { ac: 443.5, bd: 443.5 }, burn: "1" });
    expect(asReadings.corners).toEqual(asSizes.corners);
    expect([asReadings.readings.ab.reading?.exact, asReadings.readings.ab.measured.exact, asSizes.readings.ab.reading]).toEqual(["337", "336", null]);
  });

  test("`burns` overrides the burn for one reading", () => {
    const answer = ask({ length: 480, width: 360, diagonals: { ac: 600, bd: 601 }, burn: "1", burns: { ac: "0" } });
    expect([answer.shape, answer.target.readings.ac.exact, answer.target.readings.bd.exact, answer.target.reading.exact]).toEqual(["square", "600", "601", "601"]);
  });
});

describe("four sides and two diagonals", () => {
  test("S10: a true rectangle is square at every corner", () => {
    const answer = ask({ sides: rectangle.sides, diagonals: { ac: Math.hypot(336, 288), bd: Math.hypot(336, 288) } });
    expect(answer.target.diagonal.in).toBeCloseTo(rectangle.diagonal, 4);
    for (const { angleDegrees } of Object.values(answer.corners)) expect(Math.abs(angleDegrees - 90)).toBeLessThan(1e-6);
    expect([answer.shape, answer.rack.toward]).toEqual(["square", null]);
  });

  test("S11: a trapezoid with equal diagonals is tapered, never square, and says what fools", () => {
    const { A, B, C, D } = trapezoid.corners;
    const answer = ask({ sides: { ab: between(A, B), bc: between(B, C), cd: between(C, D), da: between(D, A) }, diagonals: { ac: between(A, C), bd: between(B, D) }, tolerance: "1/8" });
    expect(between(A, C)).toBeCloseTo(trapezoid.diagonal, 3);
    expect([answer.shape, answer.verdict, answer.exceeds]).toEqual(["tapered", "out", ["length-taper"]]);
    expect(answer.difference.in).toBe(0);
    expect(answer.corners.A.angleDegrees).toBeCloseTo(trapezoid.baseAngle, 3);
    expect(answer.taper?.length.in).toBeCloseTo(2, 9);
    expect(answer.proves).toContain("equal-diagonals-not-square");
  });

  test("moving CD as told makes any slab's diagonals equal, and they then read the target", () => {
    fc.assert(
      fc.property(slabs, ({ points: [A, B, C, D] }) => {
        const answer = ask({ sides: { ab: between(A, B), bc: between(B, C), cd: between(C, D), da: between(D, A) }, diagonals: { ac: between(A, C), bd: between(B, D) } });
        const shift = answer.rack.distance.in * (answer.rack.toward === "D" ? -1 : answer.rack.toward === "C" ? 1 : 0);
        const [first, second] = [between(A, [C[0] + shift, C[1]]), between(B, [D[0] + shift, D[1]])];
        expect(first).toBeCloseTo(second, 6);
        expect(answer.target.diagonal.in).toBeCloseTo(first, 6);
      }),
    );
  });
});

/** A is the origin and B on +x; the others stand anywhere within 2 in of a rectangle's corners. */
const off = fc.double({ min: -2, max: 2, noNaN: true });
const slabs = fc
  .record({ length: fc.integer({ min: 150, max: 900 }), width: fc.integer({ min: 150, max: 900 }), c: fc.tuple(off, off), d: fc.tuple(off, off) })
  .map(({ length, width, c, d }) => ({ points: [[0, 0], [length, 0], [length + c[0], width + c[1]], [d[0], width + d[1]]] as const }));

describe("tolerances", () => {
  test.each(triangleRows)("$id: a 12 by 16 ft triangle of $hypotenuse in is $openDegrees degrees off", (row) => {
    expect(triangleAt(90 + row.openDegrees)).toBeCloseTo(row.hypotenuse, 3);
    if ("over12" in row) {
      const error = (row.openDegrees * Math.PI) / 180;
      expect(Math.abs(144 * Math.sin(error) - row.over12)).toBeLessThan(2e-4);
      expect(Math.abs(192 * Math.sin(error) - row.over16)).toBeLessThan(2e-4);
    }
  });

  test.each(kentRows)("$id: a diagonal of $feet ft may be $inches in off", ({ feet, inches }) => {
    const { kind } = presets["three-quarters-per-100-ft"];
    expect(kind.of === "diagonal" && kind.share * feet * 12).toBeCloseTo(inches, 12);
  });

  test("each preset says what it allows on this slab: 1.9 in and 0.55 in on 24 by 28 ft", () => {
    // domain.md 2.2: about 1.9 in by the triangle; Kent 0.277 in on each diagonal
    const { presets: told } = ask({ length: 336, width: 288, diagonals: { ac: 442.5, bd: 442.5 } });
    expect(told.map(({ id }) => id)).toEqual(Object.keys(presets));
    expect(told[0]?.difference.in).toBeCloseTo(1.896, 3);
    expect(told[1]?.difference.in).toBeCloseTo(2 * 0.2766, 3);
    expect(told.slice(2).map(({ difference, taper, status }) => [difference.exact, taper.exact, status])).toEqual([["1/8", "1/8", "practice"], ["3/16", "3/16", "practice"], ["1/4", "1/4", "practice"]]);
  });

  test("a preset judges as it is worded, at the very limit it tells", () => {
    fc.assert(
      fc.property(fc.integer({ min: 150, max: 900 }), fc.integer({ min: 150, max: 900 }), fc.constantFrom("triangle-12-16-20", "three-quarters-per-100-ft"), (length, width, tolerance) => {
        const squares = 2 * (length ** 2 + width ** 2);
        const limit = ask({ length, width, diagonals: { ac: Math.sqrt(squares / 2), bd: Math.sqrt(squares / 2) }, tolerance }).allowed!.difference.in;
        const asked = (difference: number) => {
          const half = difference / 2;
          const mean = Math.sqrt(squares / 2 - half ** 2);
          return ask({ length, width, diagonals: { ac: mean + half, bd: mean - half }, tolerance, precision: "1/64" }).verdict;
        };
        expect([asked(limit - 0.001), asked(limit + 0.001)]).toEqual(["within", "out"]);
      }),
      { numRuns: 50 },
    );
  });

  test("a tolerance at its limit passes, one graduation past it fails; a taper has its own limit", () => {
    const sides = { ab: 336, bc: 288, cd: 336.25, da: 288 };
    const diagonals = { ac: 442.5, bd: 442.5 };
    expect(ask({ length: 336, width: 288, diagonals: { ac: "442 5/8", bd: "442 7/16" }, tolerance: "3/16" }).verdict).toBe("within");
    expect(ask({ length: 336, width: 288, diagonals: { ac: "442 11/16", bd: "442 7/16" }, tolerance: "3/16" }).verdict).toBe("out");
    expect(ask({ sides, diagonals, tolerance: "1/8" }).exceeds).toEqual(["length-taper"]);
    expect(ask({ sides, diagonals, tolerance: "1/8", taperTolerance: "3/8" }).verdict).toBe("within");
    expect(ask({ sides, diagonals, tolerance: "triangle-12-16-20", taperTolerance: "3/8" }).verdict).toBe("within");
    expect(ask({ sides: { ...sides, cd: 336.5 }, diagonals, tolerance: "triangle-12-16-20" }).exceeds).toEqual(["length-taper"]);
  });

  test("no tolerance, no verdict; a square one is square; one graduation of the precision is still square", () => {
    const request = { length: 336, width: 288, diagonals: { ac: "442 9/16", bd: "442 1/2" } };
    expect([ask(request).verdict, ask(request).shape]).toEqual([null, "square"]);
    expect(ask({ ...request, tolerance: "1/64" }).verdict).toBe("square");
    expect(ask({ ...request, precision: "1/32", tolerance: "1/64" }).verdict).toBe("out");
  });
});

describe("laws of the slab", () => {
  const six = ({ points: [A, B, C, D] }: { points: readonly [readonly [number, number], readonly [number, number], readonly [number, number], readonly [number, number]] }) => ({
    sides: { ab: between(A, B), bc: between(B, C), cd: between(C, D), da: between(D, A) },
    diagonals: { ac: between(A, C), bd: between(B, D) },
  });
  const noise = fc.record({ ab: fc.double({ min: -0.05, max: 0.05, noNaN: true }), bd: fc.double({ min: -0.05, max: 0.05, noNaN: true }) });

  test("seen in a mirror, the side moves the other way by as much", () => {
    fc.assert(
      fc.property(slabs, noise, (slab, { ab, bd }) => {
        const read = six(slab);
        const sides = { ...read.sides, ab: read.sides.ab + ab };
        const diagonals = { ac: read.diagonals.ac, bd: read.diagonals.bd + bd };
        const one = ask({ sides, diagonals });
        const other = ask({ sides: { ...sides, bc: sides.da, da: sides.bc }, diagonals: { ac: diagonals.bd, bd: diagonals.ac } });
        expect(other.rack.distance.in).toBeCloseTo(one.rack.distance.in, 6);
        expect(other.rack.toward).toBe(one.rack.toward === null ? null : one.rack.toward === "D" ? "C" : "D");
        expect(other.closureIn).toBeCloseTo(one.closureIn, 8);
        expect(other.corners.A.angleDegrees).toBeCloseTo(one.corners.B.angleDegrees, 6);
      }),
    );
  });

  test("named from another corner, it is the same slab", () => {
    fc.assert(
      fc.property(slabs, noise, (slab, { ab, bd }) => {
        const read = six(slab);
        const sides = { ...read.sides, ab: read.sides.ab + ab };
        const diagonals = { ac: read.diagonals.ac, bd: read.diagonals.bd + bd };
        const one = ask({ sides, diagonals });
        const turned = ask({ sides: { ab: sides.bc, bc: sides.cd, cd: sides.da, da: sides.ab }, diagonals: { ac: diagonals.bd, bd: diagonals.ac } });
        expect(turned.closureIn).toBeCloseTo(one.closureIn, 8);
        expect([turned.corners.A, turned.corners.B, turned.corners.C, turned.corners.D].map(({ angleDegrees }) => angleDegrees.toFixed(6))).toEqual([one.corners.B, one.corners.C, one.corners.D, one.corners.A].map(({ angleDegrees }) => angleDegrees.toFixed(6)));
        expect(turned.readings.ab.residualIn).toBeCloseTo(one.readings.bc!.residualIn!, 8);
        expect(turned.shape).toBe(one.shape);
      }),
    );
  });

  test("in millimetres it is the slab it is in inches", () => {
    fc.assert(
      fc.property(fc.integer({ min: 3000, max: 20000 }), fc.integer({ min: 3000, max: 20000 }), fc.integer({ min: -30, max: 30 }), (length, width, apart) => {
        const mean = Math.round(Math.hypot(length, width));
        const inMetric = ask({ unit: "mm", precision: "1/32", length, width, diagonals: { ac: mean + apart, bd: mean - apart }, tolerance: "10 mm" });
        const inInches = ask({ unit: "in", precision: "1/32", length: `${length} mm`, width: `${width / 10} cm`, diagonals: { ac: `${mean + apart}mm`, bd: `${(mean - apart) / 1000} m` }, tolerance: "1 cm" });
        expect(inInches).toEqual({ ...inMetric, suspects: inInches.suspects, separatingPull: inInches.separatingPull });
      }),
      { numRuns: 50 },
    );
  });
});

describe("figures that cannot be", () => {
  test.each([
    [{}, ["/diagonals required", "/length required", "/width required"]],
    [{ length: "28 ft", diagonals: { ac: "443" } }, ["/diagonals/bd required", "/width required"]],
    [{ length: "28 ft", width: "24 ft", sides: { ab: "28 ft" }, diagonals: { ac: "443", bd: "443" } }, ["/length sides-and-sizes", "/width sides-and-sizes"]],
    [{ length: "28 ft", sides: { ab: "28 ft", da: "24 ft" }, diagonals: { ac: "443", bd: "443" } }, ["/length sides-and-sizes"]],
    [{ sides: { ab: "28 ft", da: "24 ft", cd: "28 ft" }, diagonals: { ac: "443", bd: "443" } }, ["/sides/bc required"]],
    [{ sides: { bc: "24 ft" }, diagonals: { ac: "443", bd: "443" } }, ["/sides/ab required", "/sides/cd required", "/sides/da required"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "1", bd: "443" }, burn: "1" }, ["/diagonals/ac burn-over-reading"]],
    [{ sides: { ab: "336", bc: "288", cd: "336", da: "288" }, diagonals: { ac: "443", bd: "443" }, burns: { ab: "28 ft", bd: "40 ft" } }, ["/sides/ab burn-over-reading", "/diagonals/bd burn-over-reading"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "53 ft", bd: "3 ft" } }, ["/diagonals/ac diagonal-impossible", "/diagonals/bd diagonal-impossible"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "52 ft", bd: "4 ft" } }, ["/diagonals/ac diagonal-impossible", "/diagonals/bd diagonal-impossible"]],
    [{ sides: { ab: "336", bc: "288", cd: "336", da: "288" }, diagonals: { ac: "625", bd: "443" } }, ["/diagonals/ac diagonal-impossible"]],
    [{ sides: { ab: "442.5", bc: "288", cd: "442.5", da: "288" }, diagonals: { ac: "336", bd: "336" } }, ["/diagonals/ac sides-cross", "/diagonals/bd sides-cross"]], // AB and CD are the diagonals of this slab
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "443", bd: "443" }, tolerance: "loose" }, ["/tolerance unexpected-text"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "443", bd: "443" }, sides: { ef: "1" } }, ["/sides/ef unknown-field"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "443", bd: "443" }, tape: { pull: 0.1, weight: 100, span: "9000 ft", trueLength: "1 ft" } }, ["/tape/nominalLength required"]],
    [{ length: "28 ft", width: "24 ft", diagonals: { ac: "443", bd: "443" }, tape: { pull: 0.1, weight: 100, span: "100 ft" } }, ["/tape tape-impossible"]],
  ])("%j is refused field by field", (request, issues) => {
    expect(issuesFor(request)).toEqual(issues);
  });

  test("a corner that turns inward is no slab", () => {
    const [A, B, C, D] = [[0, 0], [400, 0], [120, 90], [0, 400]] as const; // C stands inside the triangle ABD
    const sides = { ab: between(A, B), bc: between(B, C), cd: between(C, D), da: between(D, A) };
    expect(issuesFor({ sides, diagonals: { ac: between(A, C), bd: between(B, D) } })).toEqual(["/diagonals/ac sides-cross", "/diagonals/bd sides-cross"]);
  });
});
