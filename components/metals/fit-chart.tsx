import { rangeWords } from "@/lib/metals/check-words";
import { fitScale, placeWords, type DensityRange, type FitScale } from "@/lib/metals/fit-scale";

export interface FitRow extends DensityRange {
  name: string;
  fits: boolean;
  /** The job says it is this one. */
  isDeclared?: boolean;
  /** "fits", "too heavy by 1.81". */
  why: string;
}

export interface FitChartProps {
  densityGPerCm3: number;
  /** Half width of the measured band. */
  uncertaintyGPerCm3: number;
  rows: readonly FitRow[];
}

/** Styles may hold variables of their own. */
type Measures = Record<`--${string}`, string>;
const measures = (of: Record<string, number>): Measures =>
  Object.fromEntries(Object.entries(of).map(([name, value]) => [`--${name}`, value.toFixed(3)]));

/** Metals as ranges of density, one a line, all on one scale against what was measured. */
export function FitChart({ densityGPerCm3, uncertaintyGPerCm3, rows }: FitChartProps) {
  const band = { lowGPerCm3: densityGPerCm3 - uncertaintyGPerCm3, highGPerCm3: densityGPerCm3 + uncertaintyGPerCm3 };
  const scale = fitScale(band, rows);
  const at = scale.at(densityGPerCm3);
  return (
    <div className="fit">
      <div
        className={`fit__key${at < 12 ? " fit__key--low" : at > 88 ? " fit__key--high" : ""}`}
        style={measures({ at })}
        aria-hidden="true"
      >
        <span>this part</span>
        <i />
      </div>
      <ol>
        {rows.map((row) => (
          <Row key={`${row.name}${row.isDeclared ? " declared" : ""}`} row={row} band={band} at={at} scale={scale} />
        ))}
      </ol>
      <div className="fit__axis" aria-hidden="true">
        {scale.ticks.map((tick) => (
          <span key={tick.words} style={measures({ at: scale.at(tick.gPerCm3) })}>
            {tick.words}
          </span>
        ))}
      </div>
      <p className="fit__unit" aria-hidden="true">
        g/cm³
      </p>
    </div>
  );
}

interface RowProps {
  row: FitRow;
  band: DensityRange;
  at: number;
  scale: FitScale;
}

function Row({ row, band, at, scale }: RowProps) {
  const { side, gPerCm3 } = placeWords(row, band, scale);
  const end = scale.at(gPerCm3);
  const classes = ["fit__row", row.fits && "fit__row--fits", row.isDeclared && "fit__row--declared"];
  return (
    <li className={classes.filter(Boolean).join(" ")}>
      <div className="fit__head">
        <span className="fit__name">
          {row.name}
          {row.isDeclared && ", declared"}
        </span>
        <span className="fig">{rangeWords(row)}</span>
      </div>
      <div className="fit__track">
        <i
          className="fit__band"
          style={measures({ from: scale.at(band.lowGPerCm3), to: scale.at(band.highGPerCm3) })}
        />
        <i className="fit__bar" style={measures({ low: scale.at(row.lowGPerCm3), high: scale.at(row.highGPerCm3) })} />
        <i className="fit__at" style={measures({ at })} />
        <span className={`fit__why fit__why--${side}`} style={measures({ from: end, to: end })}>
          {row.why}
        </span>
      </div>
    </li>
  );
}
