import type { CSSProperties } from "react";
import { shareRangeWords, shareWords } from "@/lib/costs/share-words";

interface WorthScaleProps {
  /** Shares from 0 to 1; the break-even may lie above 1: then checking never pays. */
  breakEvenRate: number;
  /** Absent when nothing was looked at. */
  rate?: number;
  interval: readonly [low: number, high: number];
}

type Place = CSSProperties & Record<`--${string}`, number>;

/** Where the break-even lies and where the shop stands, on a log scale of bad parts: a tenth more each step. */
export function WorthScale({ breakEvenRate, rate, interval }: WorthScaleProps) {
  const [low, high] = interval;
  const decades = decadesFor(breakEvenRate, rate === undefined ? [] : [rate, low]);
  const at = (share: number) => placeOf(share, decades);
  const place = (share: number): Place => ({ "--x": at(share) });
  const even = place(breakEvenRate);
  const own: Place = { "--x": at(rate ?? 0), "--a": at(low), "--b": at(high) };
  return (
    <div className="worth-scale" role="img" aria-label={saidWords(breakEvenRate, rate, interval)}>
      <p className="worth-scale__even" style={even}>
        <span>{breakEvenRate >= 1 ? "never pays" : `pays above ${shareWords(breakEvenRate)}`}</span>
      </p>
      <div className="worth-scale__track" style={even}>
        <i className="worth-scale__pays" />
        {ticksOf(decades).map((tick) => (
          <i key={tick} className="worth-scale__tick" style={place(tick)} />
        ))}
        {rate !== undefined && (
          <>
            <i className="worth-scale__range" style={own} />
            <i className="worth-scale__rate" style={own} />
          </>
        )}
        <i className="worth-scale__line" />
      </div>
      {rate !== undefined && (
        <p className="worth-scale__own" style={own}>
          <span>
            yours {shareWords(rate)}
            <small>{shareRangeWords(low, high)}</small>
          </span>
        </p>
      )}
      <div className="worth-scale__axis">
        {ticksOf(decades).map((tick) => (
          <span key={tick} style={place(tick)}>
            {tickWords(tick)}
          </span>
        ))}
      </div>
    </div>
  );
}

/** Powers of ten at both ends, wide enough for all figures, at least two decades. The right end is all parts. */
function decadesFor(breakEvenRate: number, shares: readonly number[]): number {
  const smallest = Math.min(0.1, ...[breakEvenRate, ...shares].filter((share) => share > 0));
  return Math.min(7, Math.max(2, Math.ceil(-Math.log10(smallest) + 0.15)));
}

/** 0 to 100. A share of 0 has no place on a log scale: it stands at the left end. */
function placeOf(share: number, decades: number): number {
  if (share <= 0) return 0;
  return Math.min(100, Math.max(0, (1 + Math.log10(share) / decades) * 100));
}

function ticksOf(decades: number): number[] {
  return Array.from({ length: decades + 1 }, (_, step) => 10 ** (step - decades));
}

function tickWords(share: number): string {
  return `${Number((share * 100).toPrecision(1))}%`;
}

function saidWords(breakEvenRate: number, rate: number | undefined, interval: readonly [number, number]): string {
  const even =
    breakEvenRate >= 1 ? "Checking never pays" : `Checking pays above ${shareWords(breakEvenRate)} bad parts`;
  if (rate === undefined) return `${even}. No share of your own yet.`;
  return `${even}. Yours: ${shareWords(rate)}, ${shareRangeWords(...interval)}.`;
}
