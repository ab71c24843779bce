export interface GaugeProps {
  /** What is read: "Copper cover". */
  label: string;
  /** The reading in words: "71%". */
  words: string;
  value: number;
  /** The box: middle 90 % of sound parts here. */
  low: number;
  high: number;
  /** The box in words: "88 to 99%". */
  usual: string;
  /** Ends of the scale. */
  min: number;
  max: number;
  /** Earlier checks, as faint pips. */
  earlier?: readonly number[];
}

/** A reading against what is usual here: green box, arrow at this one, rust when outside. */
export function Gauge({ label, words, value, low, high, usual, min, max, earlier = [] }: GaugeProps) {
  const at = (reading: number) => `${Math.min(100, Math.max(0, ((reading - min) / (max - min)) * 100))}%`;
  const out = value < low || value > high;
  const said = `${label} ${words}, ${out ? "outside" : "inside"} the usual ${usual}`;
  return (
    <div className="reading">
      <span aria-hidden="true">{label}</span>
      <span className={out ? "fig bad" : "fig"} aria-hidden="true">
        {words}
      </span>
      <span className={out ? "gauge gauge--out" : "gauge"} role="img" aria-label={said}>
        <i style={{ left: at(low), width: `calc(${at(high)} - ${at(low)})` }} />
        {earlier.map((reading, index) => (
          <u key={index} style={{ left: at(reading) }} />
        ))}
        <b style={{ left: at(value) }} />
      </span>
    </div>
  );
}
