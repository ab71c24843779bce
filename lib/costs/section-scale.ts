/** One layer in the drawing of a section: shares of its height, from the top down. */
export interface SectionBand {
  topShare: number;
  share: number;
  /** False: drawn thicker than it is against the others, so that it can be seen. */
  isToScale: boolean;
}

/** Where everything lies in a section of a deposit. */
export interface SectionScale {
  /** In the order of the thicknesses, from the base out: the last one lies on top. */
  bands: SectionBand[];
  base: { topShare: number; share: number };
  /** A bar to measure with: a round thickness, and its share of the height. Absent when no layer is to scale. */
  bar?: { um: number; share: number };
}

/** Air above the topmost layer. */
const HEAD_SHARE = 0.05;
/** Below this a layer cannot be seen, or told from a line. */
const LEAST_SHARE = 0.06;
/** What the layers take of the height by how many there are; the rest is the base, cut short. */
const LAYERS_SHARE = [0, 0.34, 0.56, 0.68] as const;
const MOST_LAYERS_SHARE = 0.76;

/**
 * Heights of the layers of a deposit in a drawing: in their true ratio, except for those too thin to be seen, which get
 * the least height that can, and say so. Shares of head, bands and base add up to 1. Thicknesses are above 0, one or more.
 *
 * Example: 1 and 3 µm share 56 % of the height as 14 and 42 %.
 */
export function sectionScale(thicknessesUm: readonly number[]): SectionScale {
  const all = LAYERS_SHARE[thicknessesUm.length] ?? MOST_LAYERS_SHARE;
  const least = Math.min(LEAST_SHARE, (all / thicknessesUm.length) * 0.7);
  const { raised, sharePerUm } = raiseThinOnes(thicknessesUm, all, least);
  let topShare = HEAD_SHARE;
  const bands: SectionBand[] = [];
  for (const um of thicknessesUm.toReversed()) {
    const isToScale = !raised.has(um);
    const share = isToScale ? um * sharePerUm : least;
    bands.unshift({ topShare, share, isToScale });
    topShare += share;
  }
  const bar = barFor(sharePerUm, all);
  return { bands, base: { topShare, share: 1 - topShare }, ...(bar ? { bar } : {}) };
}

/** Takes the thinnest out of the scale as long as the rest leave it less than can be seen. Equal ones go together. */
function raiseThinOnes(thicknessesUm: readonly number[], all: number, least: number) {
  const raised = new Set<number>();
  const scaleOf = () => {
    const rest = thicknessesUm.filter((um) => !raised.has(um));
    const left = all - (thicknessesUm.length - rest.length) * least;
    return left / rest.reduce((sum, um) => sum + um, 0);
  };
  for (const um of new Set(thicknessesUm.toSorted((a, b) => a - b))) {
    if (um * scaleOf() >= least) break;
    raised.add(um);
  }
  return { raised, sharePerUm: scaleOf() };
}

/** The greatest of 1, 2, 5 × 10ⁿ µm that is no longer than a third of the layers. */
function barFor(sharePerUm: number, all: number): { um: number; share: number } | undefined {
  if (!Number.isFinite(sharePerUm)) return undefined;
  const mostUm = all / 3 / sharePerUm;
  const power = 10 ** Math.floor(Math.log10(mostUm));
  const um = [5, 2, 1].map((step) => step * power).find((each) => each <= mostUm) ?? power;
  return { um: Number(um.toPrecision(1)), share: um * sharePerUm };
}
