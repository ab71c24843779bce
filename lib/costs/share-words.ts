/**
 * A share from 0 to 1 as people read it: two figures that count, whole percents from ten up.
 * @example shareWords(0.00358) === "0.36%"; shareWords(0.0452) === "4.5%"; shareWords(0.127) === "13%"
 */
export function shareWords(share: number): string {
  return `${percentFigure(share)}%`;
}

/** Two shares as an interval, with one sign. @example shareRangeWords(0.039, 0.052) === "3.9 to 5.2%" */
export function shareRangeWords(low: number, high: number): string {
  return `${percentFigure(low)} to ${percentFigure(high)}%`;
}

function percentFigure(share: number): string {
  const percent = share * 100;
  if (percent >= 9.95) return percent.toFixed(0);
  if (percent === 0) return "0";
  // Number() drops the exponent that toPrecision would write for very small shares.
  const figure = Number(percent.toPrecision(2));
  const digits = Math.min(12, Math.max(0, 1 - Math.floor(Math.log10(figure))));
  return figure.toFixed(digits);
}
