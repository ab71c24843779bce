/** A call beside what was confirmed. Null: "can't tell". */
export interface CallPair {
  called: string | null;
  confirmed: string | null;
}

export interface Agreement {
  agreed: number;
  calls: number;
  /** The mix-up that happened most, if any happened twice. */
  worst: { called: string; confirmed: string; times: number } | null;
}

/**
 * How often a person's calls were confirmed. "Can't tell" is honest and is not counted, neither way.
 * No calls give 0 of 0.
 */
export function agreementOf(pairs: readonly CallPair[]): Agreement {
  const counted = pairs.filter((pair) => pair.called !== null && pair.confirmed !== null);
  const mixUps = new Map<string, { called: string; confirmed: string; times: number }>();
  for (const { called, confirmed } of counted) {
    if (called === null || confirmed === null || called === confirmed) continue;
    const key = `${called}|${confirmed}`;
    mixUps.set(key, { called, confirmed, times: (mixUps.get(key)?.times ?? 0) + 1 });
  }
  const worst = [...mixUps.values()].toSorted((a, b) => b.times - a.times)[0];
  return {
    agreed: counted.filter((pair) => pair.called === pair.confirmed).length,
    calls: counted.length,
    worst: worst && worst.times > 1 ? worst : null,
  };
}
