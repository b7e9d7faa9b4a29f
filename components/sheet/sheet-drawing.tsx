import { hatchPath, isMark, linePath, markPath, samplePoints } from "@/lib/client/sheet/paths";
import type { Drawing, Drawn, LineRole, MarkShape } from "@/lib/client/sheet/sheet";

/** A drawing of the sheet at its size on paper: points of the model are points on the page, so the printed scale is the stated one. */
export function SheetDrawing({ drawing, description }: { drawing: Drawing; description: string }) {
  return (
    <svg className="sheet-drawing" width={`${drawing.width}pt`} height={`${drawing.height}pt`} viewBox={`0 0 ${drawing.width} ${drawing.height}`} role="img" aria-label={description}>
      {drawing.items.map((item, index) => (
        <Item key={index} item={item} />
      ))}
    </svg>
  );
}

/** A sample for the legend. */
export function SheetSample({ sample }: { sample: LineRole | MarkShape }) {
  return (
    <svg className="sheet-sample" width="18pt" height="10pt" viewBox="0 0 18 10" aria-hidden="true" focusable="false">
      <Item item={isMark(sample) ? { kind: "mark", shape: sample, at: [9, 5] } : { kind: "line", role: sample, points: samplePoints[sample], closed: samplePoints[sample].length > 2 }} />
    </svg>
  );
}

function Item({ item }: { item: Drawn }) {
  if (item.kind === "line") {
    return (
      <>
        <path className={`sheet-line-${item.role}`} d={linePath(item)} />
        {item.role === "offcut" ? <path className="sheet-hatch" d={hatchPath(item.points)} /> : null}
      </>
    );
  }
  if (item.kind === "mark") {
    const { path, fill, stroke } = markPath(item.shape, item.at);
    return <path className={fill === "ink" ? "sheet-mark-full" : "sheet-mark-open"} strokeWidth={stroke} d={path} />;
  }
  const [x, y] = item.at;
  return (
    <text className={`sheet-font-${item.font}`} x={x} y={y} fontSize={item.size} textAnchor={item.anchor} transform={item.turn === undefined || item.turn === 0 ? undefined : `rotate(${item.turn} ${x} ${y})`}>
      {item.text}
    </text>
  );
}
