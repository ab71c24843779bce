import { checkAddress, typedAgain, type KeptWeights } from "@/lib/metals/check-address";
import type { Declared } from "@/lib/metals/check-words";
import { caseWarning, checkWarning, weighedWords, type KeptCheck } from "@/lib/metals/check-warning";
import type { ShopUnits } from "@/lib/metals/typed-check";
import { routes } from "@/lib/routes";

/** A part that weighed unlike what its job declares, as a screen says it. */
export interface Misfit {
  /** "Weighs like zinc die cast, 6.64 ± 0.24 g/cm³. Declared brass C360." */
  words: string;
  /** "Tobias Lindqvist weighed it, 14 Jul 14:20." */
  who: string;
  /** The weighing, as it was. */
  href: string;
}

/** The newest check of a job, with who weighed and when. */
export type NewestCheck = KeptCheck & KeptWeights & { by: string; at: number };

interface Saying {
  shop: { units: ShopUnits; timeZone: string };
  now: number;
}

/** The newest check of a job against what the job declares now; undefined when nobody weighed, or it fits. */
export function jobMisfit(
  check: NewestCheck | null | undefined,
  job: Declared & { number: string },
  saying: Saying,
): Misfit | undefined {
  const words = checkWarning(check, job);
  return check && words !== null ? said(check, words, { job: job.number, case: null }, saying) : undefined;
}

/** The newest check of a case's job against the job's metal and the case's own. */
export function caseMisfit(
  check: NewestCheck | null,
  facts: Declared & { ref: string; job: Declared & { number: string } },
  saying: Saying,
): Misfit | undefined {
  const words = caseWarning(check, facts.job, facts);
  return check && words !== null ? said(check, words, { job: facts.job.number, case: facts.ref }, saying) : undefined;
}

function said(
  check: NewestCheck,
  words: string,
  of: { job: string; case: string | null },
  { shop, now }: Saying,
): Misfit {
  return {
    words,
    who: weighedWords(check, shop.timeZone, now),
    href: routes.partCheck(checkAddress(typedAgain(check, shop.units), of)),
  };
}
