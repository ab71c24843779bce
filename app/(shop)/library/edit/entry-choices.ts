import type { EntryChoices } from "@/components/library/entry-choices";
import type { Db } from "@/db/open";
import { listShelf } from "@/db/queries/library-entries";
import { listStations } from "@/db/queries/line";
import { STATION_KINDS } from "@/lib/cases/case-words";
import { metalOrName, type NameWords } from "@/lib/library/entry-fields";
import type { EntryKind } from "@/lib/library/entry-kinds";
import type { Shelf } from "@/lib/library/library-entry";

/** What an entry of this kind may point at. What its form has no field for is left out, to keep the page light. */
export function entryChoices(db: Db, shopId: number, entry: EntryKind): EntryChoices {
  const shelf = listShelf(db, shopId);
  const stations = listStations(db, shopId);
  const titleOf = new Map(shelf.classes.map(({ slug, title }) => [slug, title]));
  return {
    classes: entry === "fix" ? [] : shelf.classes.map(({ slug, title }) => ({ slug, title })),
    causes:
      entry !== "fix"
        ? []
        : shelf.causes.map(({ slug, title, classSlugs }) => ({
            slug,
            title,
            of: titleOf.get(classSlugs[0] ?? "") ?? "",
          })),
    cautions: entry !== "fix" ? [] : shelf.cautions.map(({ key, level, text }) => ({ key, level, text })),
    sources: shelf.sources,
    stations: STATION_KINDS.map((kind) => ({
      kind,
      name: stations.find((station) => station.kind === kind)?.name ?? capital(kind),
    })),
  };
}

/** What the names inside an entry stand for: titles of classes and causes, citations, words of cautions. */
export function nameWords(...shelves: readonly Shelf[]): NameWords {
  const words = new Map<string, string>();
  for (const shelf of shelves) {
    for (const source of shelf.sources) words.set(source.key, source.citation);
    for (const caution of shelf.cautions) words.set(caution.key, caution.text);
    for (const cause of shelf.causes) words.set(cause.slug, cause.title);
    for (const each of shelf.classes) words.set(each.slug, each.title);
  }
  return (name) => words.get(name) ?? metalOrName(name);
}

const capital = (word: string) => `${word.charAt(0).toUpperCase()}${word.slice(1)}`;
