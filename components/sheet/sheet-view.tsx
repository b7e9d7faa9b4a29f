import { brandPaths } from "@/lib/client/sheet/paths";
import type { Sheet } from "@/lib/client/sheet/sheet";
import { SheetDrawing, SheetSample } from "./sheet-drawing";
import { SheetSection } from "./sheet-sections";

const quietZone = 4;

/** The field sheet as a page: what the PDF says, in the same words, for a screen and for the browser's own printing. */
export function SheetView({ sheet, code }: { sheet: Sheet; code: { path: string; size: number } }) {
  const { plan, beside, sections } = sheet;
  const codeSize = code.size + 2 * quietZone;
  return (
    <article className="sheet-paper" data-paper={sheet.paper} aria-labelledby="sheet-title">
      <p className="sheet-brand">
        <svg width="21pt" height="21pt" viewBox="0 0 30 30" aria-hidden="true" focusable="false">
          {brandPaths.map(({ path, width, dash }) => (
            <path key={path} className={dash === null ? "sheet-brand-ink" : "sheet-brand-chalk"} d={path} strokeWidth={width} strokeDasharray={dash?.join(" ")} />
          ))}
        </svg>
        {sheet.brand}
      </p>
      <h1 id="sheet-title">{sheet.title}</h1>
      <dl className="sheet-facts">
        {sheet.facts.map(({ label, text }) => (
          <div key={label}>
            <dt>{label}</dt>
            {text === null ? <dd className="sheet-blank" /> : <dd>{text}</dd>}
          </div>
        ))}
      </dl>
      {sheet.warnings.length === 0 ? null : (
        <ul className="sheet-warnings">
          {sheet.warnings.map((warning) => (
            <li key={warning}>{warning}</li>
          ))}
        </ul>
      )}
      {sheet.empty === null ? null : <p>{sheet.empty}</p>}
      <div className="sheet-top">
        {plan === null ? null : (
          <figure className="sheet-plan">
            <SheetDrawing drawing={plan.drawing} description={plan.description} />
            <figcaption>
              <b>{plan.scale}</b>
              {plan.notes.map((note) => (
                <span key={note} className="sheet-note">
                  {note}
                </span>
              ))}
              <span className="sheet-legend">
                {plan.legend.map(({ sample, text }) => (
                  <span key={sample}>
                    <SheetSample sample={sample} /> {text}
                  </span>
                ))}
              </span>
            </figcaption>
          </figure>
        )}
        <div className="sheet-beside">
          {beside.map((table) => (
            <SheetSection key={table.id} section={table} />
          ))}
        </div>
      </div>
      {sections.flatMap((section) => (section.kind === "signOff" ? [] : [<SheetSection key={section.id} section={section} />]))}
      <div className="sheet-end">
        {sections.flatMap((section) => (section.kind === "signOff" ? [<SheetSection key={section.id} section={section} />] : []))}
        <div className="sheet-code" data-address={sheet.code.address}>
          <svg viewBox={`${-quietZone} ${-quietZone} ${codeSize} ${codeSize}`} width={`${Math.round(Math.min(210, Math.max(96, codeSize * 1.1)))}pt`} role="img" aria-label={sheet.code.title} shapeRendering="crispEdges">
            <path className="sheet-code-ink" d={code.path} />
          </svg>
          <b>{sheet.code.title}</b>
          <p>{sheet.code.text}</p>
        </div>
      </div>
    </article>
  );
}
