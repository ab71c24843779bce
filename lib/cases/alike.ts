import {
  BASE_METAL_TITLES,
  METHOD_TITLES,
  STAGE_TITLES,
  SYMPTOMS,
  type BaseMetal,
  type Method,
  type StageFound,
  type Symptom,
} from "./case-words";

/** What two cases are compared by. */
export interface ComparedCase {
  id: number;
  openedAt: number;
  baseMetal: BaseMetal;
  method: Method;
  stageFound: StageFound;
  symptoms: readonly Symptom[];
  /** Confirmed, or null while nobody confirmed it. */
  confirmedClass: string | null;
  calledClass: string | null;
}

/**
 * How much each likeness counts. The weights are ours: class and symptoms say most about the fault, the metal decides
 * how it looks, stage and method only how it was met. No study stands behind them.
 */
export const ALIKE_WEIGHTS = {
  sameClass: 4,
  /** Shared symptoms over all symptoms that either has. */
  symptoms: 3,
  metal: 2,
  stage: 1,
  method: 1,
  /** Times the likeness of the two photos' readings, 0 to 1, where both have one. */
  reading: 3,
} as const;

/** Below this a case has little more than its metal or its place in common. */
const LEAST_SCORE = 4;

export interface AlikeRank<Case extends ComparedCase> {
  found: Case;
  score: number;
  /** Why it is alike: "Same class", "brass too", "shares patchy, hazy". */
  why: string[];
}

/**
 * The cases that are most like this one, best first. Among equals the newer one stands first, then the higher row number,
 * so that the order never changes between two looks.
 * @param readingLikeness how alike the photos of a case are to this one's by their readings, 0 to 1; null where one of
 *   the two has no reading, and then it counts neither for nor against
 */
export function rankAlike<Case extends ComparedCase>(
  of: ComparedCase,
  candidates: readonly Case[],
  limit: number,
  readingLikeness: (candidate: Case) => number | null = () => null,
): AlikeRank<Case>[] {
  return candidates
    .filter((candidate) => candidate.id !== of.id)
    .map((candidate) => likeness(of, candidate, readingLikeness(candidate)))
    .filter((rank) => rank.score >= LEAST_SCORE)
    .toSorted((a, b) => b.score - a.score || b.found.openedAt - a.found.openedAt || b.found.id - a.found.id)
    .slice(0, limit);
}

function likeness<Case extends ComparedCase>(of: ComparedCase, found: Case, reading: number | null): AlikeRank<Case> {
  const ownClass = of.confirmedClass ?? of.calledClass;
  const shared = found.symptoms.filter((each) => of.symptoms.includes(each));
  const either = new Set([...of.symptoms, ...found.symptoms]).size;
  const isClass = ownClass !== null && ownClass === (found.confirmedClass ?? found.calledClass);
  const is = {
    metal: of.baseMetal === found.baseMetal,
    stage: of.stageFound === found.stageFound,
    method: of.method === found.method,
  };
  const score =
    (isClass ? ALIKE_WEIGHTS.sameClass : 0) +
    (either > 0 ? (ALIKE_WEIGHTS.symptoms * shared.length) / either : 0) +
    (is.metal ? ALIKE_WEIGHTS.metal : 0) +
    (is.stage ? ALIKE_WEIGHTS.stage : 0) +
    (is.method ? ALIKE_WEIGHTS.method : 0) +
    ALIKE_WEIGHTS.reading * (reading ?? 0);
  const why = [
    isClass && (of.confirmedClass ? "same class" : "confirmed as what this one was called"),
    shared.length > 0 && `shares ${shared.map((each) => SYMPTOMS[each].words.toLowerCase()).join("; ")}`,
    is.metal && `${BASE_METAL_TITLES[of.baseMetal].toLowerCase()} too`,
    is.stage && `found ${STAGE_TITLES[of.stageFound].charAt(0).toLowerCase()}${STAGE_TITLES[of.stageFound].slice(1)}`,
    is.method && `${METHOD_TITLES[of.method].toLowerCase()} plating`,
    reading !== null && reading >= 0.5 && "photo reads alike",
  ];
  return { found, score, why: why.filter((words) => words !== false) };
}
