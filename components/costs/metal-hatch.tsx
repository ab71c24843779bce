import type { BaseMetal } from "@/lib/cases/case-words";
import type { DepositMetal } from "@/lib/plating/metals";

interface Hatch {
  width: number;
  height: number;
  /** Lines, in pixels of one tile. */
  lines?: string;
  /** Dots: centre and radius. */
  dots?: readonly (readonly [x: number, y: number, r: number])[];
  turned?: number;
}

/** One hatch for each deposit, so that layers are told apart without colour. Copper is plain. */
const HATCHES: Record<DepositMetal, Hatch> = {
  Cu: { width: 8, height: 8 },
  Ni: { width: 6, height: 14, lines: "M1 0V14M4 3V10" },
  Au: { width: 8, height: 8, dots: [[2, 2, 1.1], [6, 6, 1.1]] },
  Ag: { width: 10, height: 6, lines: "M0 3H10" },
  Pd: { width: 7, height: 7, lines: "M0 0V7", turned: -45 },
  Rh: { width: 8, height: 8, lines: "M0 0L8 8M8 0L0 8" },
  Pt: { width: 11, height: 11, lines: "M2 5.5H9M5.5 2V9" },
  Cr: { width: 10, height: 8, lines: "M0 6L5 2L10 6" },
  Zn: { width: 9, height: 9, lines: "M0 0V9M4 0V9", turned: -30 },
  Sn: { width: 12, height: 12, dots: [[3, 3, 2.2], [9, 9, 2.2]] },
  Co: { width: 5, height: 8, lines: "M2.5 0V8" },
  Fe: { width: 5, height: 5, lines: "M0 0V5", turned: 45 },
  Cd: { width: 12, height: 8, lines: "M1 2H6M7 6H12" },
  Pb: { width: 6, height: 6, lines: "M0 3H6M3 0V6" },
  In: { width: 12, height: 8, lines: "M0 4Q3 1 6 4T12 4" },
}; // prettier-ignore

/** The widest hatch of all is the part's own. */
const BASE_HATCH: Hatch = { width: 11, height: 11, lines: "M0 0V11", turned: 45 };

interface HatchProps {
  /** Of the pattern; used as `url(#id)`. */
  id: string;
}

/** The fill of one deposit in a section. */
export function DepositHatch({ id, metal }: HatchProps & { metal: DepositMetal }) {
  return <Pattern id={id} hatch={HATCHES[metal]} fill={`var(--metal-${metal.toLowerCase()})`} />;
}

/** The fill of the part itself in a section. */
export function BaseHatch({ id, metal }: HatchProps & { metal: BaseMetal }) {
  return <Pattern id={id} hatch={BASE_HATCH} fill={`var(--base-${metal})`} />;
}

function Pattern({ id, hatch, fill }: HatchProps & { hatch: Hatch; fill: string }) {
  const { width, height, lines, dots = [], turned } = hatch;
  return (
    <pattern
      id={id}
      width={width}
      height={height}
      patternUnits="userSpaceOnUse"
      patternTransform={turned ? `rotate(${turned})` : undefined}
    >
      <rect width={width} height={height} style={{ fill }} />
      {lines && <path className="hatch__line" d={lines} />}
      {dots.map(([x, y, r]) => (
        <circle key={`${x} ${y}`} className="hatch__dot" cx={x} cy={y} r={r} />
      ))}
    </pattern>
  );
}
