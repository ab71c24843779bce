import { CASE_REF_PATTERN } from "./case-ref";

/** Cases that can be set side by side at once: four photos still fit a bench screen. */
export const MOST_BESIDE = 4;
export const LEAST_BESIDE = 2;

/**
 * The references that an address names, each once, at most four: "CT-2607-0042,CT-2607-0044", or one a field as a form
 * without script sends them. What is no reference is left out.
 */
export function readRefs(value: string | readonly string[] | undefined): string[] {
  const given = typeof value === "string" ? [value] : (value ?? []);
  const refs = given.flatMap((each) => each.split(",")).map((each) => each.trim().toUpperCase());
  return [...new Set(refs.filter((ref) => CASE_REF_PATTERN.test(ref)))].slice(0, MOST_BESIDE);
}

/** Takes a case out, or sets it beside the others while there is room. */
export function toggleRef(refs: readonly string[], ref: string): string[] {
  if (refs.includes(ref)) return refs.filter((each) => each !== ref);
  return refs.length < MOST_BESIDE ? [...refs, ref] : [...refs];
}

/** The picked cases as the casebook's address keeps them. */
export function besideAddress(refs: readonly string[]): Record<string, string> {
  return refs.length > 0 ? { beside: refs.join(",") } : {};
}
