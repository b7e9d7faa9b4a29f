import type { ReactNode } from "react";

/** The small drawings of the work that stand for each calculator. Decorative: the name is beside them. */
function Tile({ children }: { children: ReactNode }) {
  return (
    <svg className="tile-drawing" width="150" height="92" viewBox="0 0 150 92" aria-hidden="true" focusable="false">
      {children}
    </svg>
  );
}

const slab = { fill: "var(--concrete)", stroke: "var(--edge-strong)", strokeWidth: 2 } as const;
const chalk = { fill: "none", stroke: "var(--chalk-line)" } as const;

function SquarenessTile() {
  return (
    <Tile>
      <polygon points="20,78 118,78 132,14 34,14" {...slab} />
      <path d="M20 78 132 14" {...chalk} strokeWidth="2.4" />
      <path d="M118 78 34 14" {...chalk} strokeWidth="2.4" strokeDasharray="8 4" />
    </Tile>
  );
}

function CornerTile() {
  return (
    <Tile>
      <path d="M24 8v72h112" fill="none" stroke="var(--edge-strong)" strokeWidth="2" />
      <path d="M24 26v54h72" {...chalk} strokeWidth="3" />
      <path d="M24 26 96 80" {...chalk} strokeWidth="2.4" strokeDasharray="8 4" />
      <path d="M24 66h14v14" fill="none" stroke="var(--ink)" strokeWidth="1.6" />
      <path d="M19 26h10M96 75v10" stroke="var(--keel)" strokeWidth="2.6" />
    </Tile>
  );
}

function InsetTile() {
  return (
    <Tile>
      <rect x="16" y="12" width="118" height="68" {...slab} />
      <rect x="26" y="22" width="98" height="48" {...chalk} strokeWidth="3" />
    </Tile>
  );
}

function AnchorsTile() {
  return (
    <Tile>
      <rect x="8" y="34" width="134" height="24" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      {[22, 58, 93, 128].map((x) => (
        <circle key={x} cx={x} cy="46" r="5.5" fill="var(--steel)" />
      ))}
      <path d="M22 66h106M22 62v8M58 62v8M93 62v8M128 62v8" fill="none" stroke="var(--ink)" strokeWidth="1.6" />
    </Tile>
  );
}

function ConversionsTile() {
  return (
    <Tile>
      <rect x="1" y="18" width="148" height="52" fill="var(--blade)" stroke="var(--edge)" strokeWidth="1.5" />
      {Array.from({ length: 17 }, (_, tick) => {
        const x = 11 + tick * 8;
        const length = tick % 16 === 0 ? 40 : tick % 8 === 0 ? 30 : tick % 4 === 0 ? 24 : tick % 2 === 0 ? 17 : 11;
        return tick === 14 ? (
          <line key={tick} x1={x} x2={x} y1="19" y2="47" stroke="var(--keel)" strokeWidth="3.4" />
        ) : (
          <line key={tick} x1={x} x2={x} y1="19" y2={19 + length} stroke="var(--ink)" strokeWidth="1.4" />
        );
      })}
      <path d="M123 50l-6 9h12z" fill="var(--keel)" />
    </Tile>
  );
}

function FootprintTile() {
  return (
    <Tile>
      <path d="M16 80V12h66v28h52v40z" {...slab} />
      <path d="M134 80 82 40 16 80M16 12l66 28" {...chalk} strokeWidth="2.4" strokeDasharray="8 4" />
    </Tile>
  );
}

function FitTile() {
  return (
    <Tile>
      <polygon points="14,76 138,82 132,10 20,16" {...slab} />
      <rect x="26" y="22" width="98" height="48" {...chalk} strokeWidth="3" />
      <path d="M44 78v-8M106 80V70M18 46h8" stroke="var(--keel)" strokeWidth="2.6" />
    </Tile>
  );
}

function LevelTile() {
  return (
    <Tile>
      <path d="M12 80V46l40 6 46 14 40-12v26z" {...slab} />
      <path d="M8 44h134" {...chalk} strokeWidth="2.6" strokeDasharray="8 4" />
      <path d="M98 44v22M52 44v8" stroke="var(--keel)" strokeWidth="2.6" />
    </Tile>
  );
}

function PlatesTile() {
  return (
    <Tile>
      <rect x="10" y="30" width="78" height="28" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      <rect x="92" y="30" width="50" height="28" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      {[22, 54, 104, 130].map((x) => (
        <circle key={x} cx={x} cy="44" r="4.5" fill="var(--steel)" />
      ))}
      <path d="M76 39v10M71 44h10" stroke="var(--chalk)" strokeWidth="2.6" />
    </Tile>
  );
}

function TakeoffTile() {
  return (
    <Tile>
      {[62, 48, 34].map((y, index) => (
        <rect key={y} x="12" y={y} width={96 - index * 16} height="12" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      ))}
      <circle cx="126" cy="58" r="14" fill="none" stroke="var(--steel)" strokeWidth="5" />
    </Tile>
  );
}

function MarksTile() {
  return (
    <Tile>
      <rect x="10" y="38" width="132" height="26" fill="var(--timber)" stroke="var(--timber-edge)" strokeWidth="2" />
      <path d="M40 30v34M76 30v34M112 30v34" stroke="var(--ink)" strokeWidth="2" />
      <path d="M43 45l8 10m0-10-8 10M79 45l8 10m0-10-8 10M115 45l8 10m0-10-8 10" stroke="var(--keel)" strokeWidth="2.2" />
    </Tile>
  );
}

const tiles: Readonly<Record<string, () => ReactNode>> = {
  squareness: SquarenessTile,
  footprint: FootprintTile,
  level: LevelTile,
  corner: CornerTile,
  inset: InsetTile,
  fit: FitTile,
  anchors: AnchorsTile,
  plates: PlatesTile,
  takeoff: TakeoffTile,
  marks: MarksTile,
  conversions: ConversionsTile,
};

/** The drawing of a calculator by its folder name. */
export function TileDrawing({ name }: { name: string }) {
  const Drawing = tiles[name];
  return Drawing === undefined ? null : <Drawing />;
}
