/** Where metals and a reading stand on one scale of densities, in hundredths of its width. */

export interface DensityRange {
  lowGPerCm3: number;
  highGPerCm3: number;
}

export interface FitScale {
  /** 0 at the left end, 100 at the right. */
  at: (gPerCm3: number) => number;
  /** Densities to write under the scale. */
  ticks: { gPerCm3: number; words: string }[];
}

/** The side of a bar on which its words stand, and the density at which they begin (after) or end (before). */
export interface WordsPlace {
  side: "after" | "before";
  gPerCm3: number;
}

/** So much of the width stays free at each end. */
const MARGIN = 0.05;
/** The longest reason takes this share of a phone's width. */
const ROOM_FOR_WORDS = 0.47;
const STEPS = [0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5];
const MOST_TICKS = 6;

/**
 * One scale for the measured band and every range drawn with it. It reaches further right where some bar's words would
 * find no room beside it.
 */
export function fitScale(band: DensityRange, ranges: readonly DensityRange[]): FitScale {
  const all = [band, ...ranges];
  const lowest = Math.min(...all.map((each) => each.lowGPerCm3));
  const highest = Math.max(...all.map((each) => each.highGPerCm3));
  const margin = Math.max(highest - lowest, 0.02) * MARGIN;
  const from = Math.max(0, lowest - margin);
  const tight = highest + margin - from;
  const isCramped = ranges.some((range) => widest(gapsBeside(range, band, from, from + tight)).share < ROOM_FOR_WORDS);
  const width = isCramped ? Math.max(tight, (highest - from) / (1 - ROOM_FOR_WORDS)) : tight;
  return { at: (gPerCm3) => ((gPerCm3 - from) / width) * 100, ticks: ticksOf(from, width) };
}

function ticksOf(from: number, width: number): FitScale["ticks"] {
  const step = STEPS.find((each) => width / each <= MOST_TICKS) ?? 10;
  const first = Math.ceil(from / step);
  const count = Math.floor((from + width) / step) - first + 1;
  const decimals = step < 0.1 ? 2 : step < 1 ? 1 : 0;
  return Array.from({ length: count }, (_, index) => {
    const gPerCm3 = (first + index) * step;
    return { gPerCm3, words: gPerCm3.toFixed(decimals) };
  });
}

/** The roomiest place for a bar's words: behind bar and band, before both, or between the two. */
export function placeWords(range: DensityRange, band: DensityRange, scale: FitScale): WordsPlace {
  const perGPerCm3 = scale.at(1) - scale.at(0);
  const from = -scale.at(0) / perGPerCm3;
  return widest(gapsBeside(range, band, from, from + 100 / perGPerCm3)).place;
}

interface Gap {
  place: WordsPlace;
  /** Of the whole width. */
  share: number;
}

const widest = (gaps: readonly [Gap, ...Gap[]]): Gap =>
  gaps.reduce((one, other) => (other.share > one.share ? other : one));

function gapsBeside(range: DensityRange, band: DensityRange, from: number, to: number): [Gap, ...Gap[]] {
  const low = Math.min(range.lowGPerCm3, band.lowGPerCm3);
  const high = Math.max(range.highGPerCm3, band.highGPerCm3);
  const share = (start: number, end: number) => (end - start) / (to - from);
  const before = (gPerCm3: number, start: number): Gap => ({
    place: { side: "before", gPerCm3 },
    share: share(start, gPerCm3),
  });
  const after = (gPerCm3: number, end: number): Gap => ({
    place: { side: "after", gPerCm3 },
    share: share(gPerCm3, end),
  });
  const between =
    range.lowGPerCm3 > band.highGPerCm3
      ? [before(range.lowGPerCm3, band.highGPerCm3)]
      : range.highGPerCm3 < band.lowGPerCm3
        ? [after(range.highGPerCm3, band.lowGPerCm3)]
        : [];
  return [after(high, to), before(low, from), ...between];
}
