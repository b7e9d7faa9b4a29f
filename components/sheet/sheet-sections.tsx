import type { Section, Table } from "@/lib/client/sheet/sheet";
import { SheetDrawing } from "./sheet-drawing";

/** One section of the sheet in reading order, as real headings, tables and lists. */
export function SheetSection({ section }: { section: Section }) {
  const heading = `sheet-${section.id}`;
  const notes = section.kind === "table" ? (section.note === undefined ? [] : [section.note]) : section.kind === "strips" || section.kind === "figures" ? section.notes : [];
  return (
    <section className="sheet-section" aria-labelledby={heading} data-kind={section.kind}>
      <h2 id={heading}>{section.title}</h2>
      {notes.map((note) => (
        <p key={note} className="sheet-note">
          {note}
        </p>
      ))}
      <Body section={section} heading={heading} />
    </section>
  );
}

function Body({ section, heading }: { section: Section; heading: string }) {
  if (section.kind === "table") return <SheetTable table={section} heading={heading} />;
  if (section.kind === "strips") {
    return (
      <ul className="sheet-strips">
        {section.strips.map(({ id, title, length, drawing, description }) => (
          <li key={id}>
            <p>
              <b>{title}</b>
              <span className="num">{length}</span>
            </p>
            <SheetDrawing drawing={drawing} description={description} />
          </li>
        ))}
      </ul>
    );
  }
  if (section.kind === "figures") {
    return (
      <ol className="sheet-figures">
        {section.items.map((item, index) => (
          <li key={index} className="num">
            {item}
          </li>
        ))}
      </ol>
    );
  }
  if (section.kind === "words") {
    return (
      <ul className="sheet-words">
        {section.items.map((item) => (
          <li key={item}>{item}</li>
        ))}
      </ul>
    );
  }
  return (
    <ul className="sheet-sign-off">
      {section.lines.map((line) => (
        <li key={line}>{line}</li>
      ))}
    </ul>
  );
}

function SheetTable({ table: { columns, rows }, heading }: { table: Table; heading: string }) {
  if (columns.length === 0) return null;
  return (
    <div className="sheet-scroll">
      <table aria-labelledby={heading}>
        <thead>
          <tr>
            {columns.map(({ text, figure }, index) => (
              <th key={index} scope="col" className={figure ? "sheet-right" : undefined}>
                {text}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((cells, row) => (
            <tr key={row}>
              {cells.map((cell, column) =>
                column === 0 ? (
                  <th key={column} scope="row">
                    {cell}
                  </th>
                ) : (
                  <td key={column} className={columns[column]?.figure ? "num sheet-right" : undefined}>
                    {cell}
                  </td>
                ),
              )}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
