import { BASE_METALS, type BaseMetal } from "@/lib/cases/case-words";
import type { DissolvingRow } from "@/lib/costs/strip-methods";

/** Base metals that a bath can be vouched for: every one that has a name. Nobody can vouch for one that has none. */
export type NamedBaseMetal = Exclude<BaseMetal, "other">;
export const NAMED_BASE_METALS = BASE_METALS.filter((metal): metal is NamedBaseMetal => metal !== "other");

/** How a bath stands to a base metal. "unknown": nobody vouches for it, so it is not offered there. */
export const STANDINGS = ["unknown", "safe", "attacks"] as const;
export type Standing = (typeof STANDINGS)[number];
export const STANDING_TITLES: Record<Standing, string> = {
  unknown: "Nobody vouches",
  safe: "Safe",
  attacks: "Goes on into it",
};

export const standingFieldName = (metal: NamedBaseMetal) => `on-${metal}` as const;
export const reasonFieldName = (metal: NamedBaseMetal) => `why-${metal}` as const;

/** How a bath stands to a base metal, and why, as its row has it. */
export function standingOn(
  row: Pick<DissolvingRow, "safeOn" | "safeBecause" | "attacks">,
  metal: BaseMetal,
): { standing: Standing; reason: string } {
  const attack = row.attacks[metal];
  if (attack !== undefined) return { standing: "attacks", reason: attack };
  if (row.safeOn.includes(metal)) return { standing: "safe", reason: row.safeBecause?.[metal] ?? "" };
  return { standing: "unknown", reason: "" };
}

/** Whether any figure of a way rests on memory alone: shown beside it until the shop has measured its own. */
export function isFromMemory(source: string): boolean {
  return /from memory/i.test(source);
}
