import type { AnyEntry } from "./entry-kinds";

/** The names that entries of a shop may point at. */
export interface KnownNames {
  classes: ReadonlySet<string>;
  causes: ReadonlySet<string>;
  cautions: ReadonlySet<string>;
  sources: ReadonlySet<string>;
}

/**
 * What an entry points at and the library does not hold, by field; empty when every link leads somewhere.
 * @example a cause of a class that was removed: { classSlugs: "The library has no class “smoky”." }
 */
export function brokenLinks(body: AnyEntry, known: KnownNames): Record<string, string> {
  const problems: Record<string, string> = {};
  const look = (field: string, kind: string, names: readonly string[], where: ReadonlySet<string>) => {
    const missing = names.find((name) => !where.has(name));
    if (missing !== undefined) problems[field] ??= `The library has no ${kind} “${missing}”.`;
  };
  if ("sourceKeys" in body) look("sourceKeys", "source", body.sourceKeys, known.sources);
  if ("sourceKey" in body) look("sourceKey", "source", [body.sourceKey], known.sources);
  if ("tells" in body) {
    const versus = body.tells.map((tell) => tell.versus);
    look("tells", "class", versus, known.classes);
    if (versus.includes(body.slug)) problems.tells ??= "A class cannot be told from itself.";
  }
  if ("classSlugs" in body) look("classSlugs", "class", body.classSlugs, known.classes);
  if ("causeSlugs" in body) look("causeSlugs", "cause", body.causeSlugs, known.causes);
  if ("steps" in body)
    look(
      "steps",
      "caution",
      body.steps.flatMap((step) => step.cautionKeys),
      known.cautions,
    );
  return problems;
}

/** The shares of a class's causes with that of "another cause", when they do not come to one: 0.8 or 1.2. Null when they do. */
export function shareSumOff(otherLikelihood: number, likelihoods: readonly number[]): number | null {
  const sum = likelihoods.reduce((total, share) => total + share, otherLikelihood);
  return likelihoods.length > 0 && Math.abs(sum - 1) > SHARE_TOLERANCE ? sum : null;
}

/** Shares are from memory, in hundredths: their sum may be off by so much. */
const SHARE_TOLERANCE = 0.02;
