import { routes } from "@/lib/routes";
import type { EntryKind } from "./entry-kinds";

/** How many of each thing point at an entry; a kind that cannot is left out. */
export interface EntryUses {
  cases?: number;
  calls?: number;
  exemplars?: number;
  answers?: number;
  drills?: number;
  causes?: number;
  lookAlikes?: number;
  fixes?: number;
  cards?: number;
}

/** Something that points at an entry, in words, and where to see it. */
export interface UseLine {
  words: string;
  href: string | null;
}

const WORDS: Record<keyof EntryUses, readonly [one: string, many: string]> = {
  cases: ["case stands under it", "cases stand under it"],
  calls: ["case was called it", "cases were called it"],
  exemplars: ["photo shows it as an exemplar", "photos show it as exemplars"],
  answers: ["practice answer names it", "practice answers name it"],
  drills: ["drill asks for it", "drills ask for it"],
  causes: ["cause shows as it", "causes show as it"],
  lookAlikes: ["class is told from it", "classes are told from it"],
  fixes: ["fix puts it right", "fixes put it right"],
  cards: ["rework card was made from it", "rework cards were made from it"],
};

/**
 * What points at an entry, one line for each kind of thing; empty when it may be removed.
 * @example useLines("class", "smoky", { cases: 3 })[0].words === "3 cases stand under it"
 */
export function useLines(kind: EntryKind, slug: string, uses: EntryUses): UseLine[] {
  const names = Object.keys(WORDS) as (keyof EntryUses)[];
  return names.flatMap((name) => {
    const many = uses[name] ?? 0;
    if (many === 0) return [];
    const [one, several] = WORDS[name];
    return [{ words: `${many} ${many === 1 ? one : several}`, href: hrefOf(kind, slug, name) }];
  });
}

function hrefOf(kind: EntryKind, slug: string, name: keyof EntryUses): string | null {
  if (name === "cases" && kind !== "fix") return routes.casebook(kind === "class" ? { class: slug } : { cause: slug });
  if (kind === "class" && (name === "exemplars" || name === "causes")) return routes.libraryClass(slug);
  return null;
}
