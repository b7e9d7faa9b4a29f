import { Chalk, Concrete, CornerLetter, Dimension, Pull } from "../drawing/plan-parts";
import { cornerNames, frameFor, pathOf, pixel, rectangleOf, type Point } from "../drawing/plan-geometry";

/** A made-up workshop slab, in inches: sides, inset drawn wide enough to see, plate, and bolt stations along each pair of walls. */
const length = 336;
const width = 264;
const inset = 5;
const plate = 8;
const longWall = [22, 74, 128, 183, 200, 257, 314];
const shortWall = [26, 84, 141, 158, 206, 240];
const joints = { long: 191, short: 150 };

/** The whole work in one drawing: concrete, chalk, plates, joints, bolts and the two pulls that prove it. */
export function HeroPlan({ description }: { description: string }) {
  const frame = frameFor(length, width, 560, { left: 58, right: 50, top: 48, bottom: 56 }, 400);
  const slab = rectangleOf(length, width);
  const ring = (by: number): Point[] => [
    frame.place({ x: by, y: by }),
    frame.place({ x: length - by, y: by }),
    frame.place({ x: length - by, y: width - by }),
    frame.place({ x: by, y: width - by }),
  ];
  const middleLine = inset + plate / 2;
  const bolts = [
    ...longWall.flatMap((station) => [frame.place({ x: station, y: middleLine }), frame.place({ x: length - station, y: width - middleLine })]),
    ...shortWall.flatMap((station) => [frame.place({ x: length - middleLine, y: station }), frame.place({ x: middleLine, y: width - station })]),
  ];
  const across = (from: Point, to: Point) => `M${from.x} ${from.y}L${to.x} ${to.y}`;
  const at = { A: frame.place(slab.A), B: frame.place(slab.B), C: frame.place(slab.C), D: frame.place(slab.D) };
  return (
    <svg viewBox={`0 0 ${frame.width} ${frame.height}`} className="plan" role="img" aria-label={description}>
      <Concrete points={[at.A, at.B, at.C, at.D]} id="hero-concrete" />
      <polygon points={pathOf(ring(middleLine))} fill="none" stroke="var(--timber-edge)" strokeWidth={pixel(plate * frame.pixelsPerInch)} />
      <polygon points={pathOf(ring(middleLine))} fill="none" stroke="var(--timber)" strokeWidth={pixel(plate * frame.pixelsPerInch - 2.6)} />
      <path
        d={[
          across(frame.place({ x: joints.long, y: inset }), frame.place({ x: joints.long, y: inset + plate })),
          across(frame.place({ x: length - joints.long, y: width - inset }), frame.place({ x: length - joints.long, y: width - inset - plate })),
          across(frame.place({ x: length - inset, y: joints.short }), frame.place({ x: length - inset - plate, y: joints.short })),
          across(frame.place({ x: inset, y: width - joints.short }), frame.place({ x: inset + plate, y: width - joints.short })),
        ].join("")}
        stroke="var(--ink)"
        strokeWidth="2"
      />
      {bolts.map(({ x, y }, index) => (
        <circle key={index} cx={x} cy={y} r="3.4" fill="var(--steel)" />
      ))}
      <Chalk points={ring(inset)} />
      <Pull from={at.A} to={at.C} number={1} />
      <Pull from={at.B} to={at.D} number={2} dashed />
      {cornerNames.map((name) => (
        <CornerLetter key={name} name={name} at={at[name]} toward={{ x: frame.width / 2, y: frame.height / 2 }} />
      ))}
      <Dimension from={at.A} to={at.B} text={`28' 0"`} />
      <Dimension from={at.A} to={at.D} text={`22' 0"`} />
    </svg>
  );
}
