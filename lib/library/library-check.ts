/** Finds what is broken inside a shelf: links that lead nowhere, shares that do not add up, facts without a source. */
import type { LibraryCause, LibraryClass, LibraryFix, Shelf } from "@/lib/library/library-entry";

/** How far the shares of a class, 'other' included, may stand from 1 (both are from memory, rounded to hundredths). */
const SHARE_TOLERANCE = 0.02;

/** The slugs and keys that entries may point at. */
interface Known {
  classes: ReadonlySet<string>;
  causes: ReadonlySet<string>;
  cautions: ReadonlySet<string>;
  sources: ReadonlySet<string>;
}

/**
 * Everything wrong with a shelf, in plain sentences; an empty list is a sound shelf.
 * The same check serves the shelf that ships and a library that a shop imports.
 */
export function checkShelf(shelf: Shelf): string[] {
  const known: Known = {
    classes: new Set(shelf.classes.map((entry) => entry.slug)),
    causes: new Set(shelf.causes.map((entry) => entry.slug)),
    cautions: new Set(shelf.cautions.map((entry) => entry.key)),
    sources: new Set(shelf.sources.map((entry) => entry.key)),
  };
  return [
    ...checkTwice(shelf),
    ...shelf.classes.flatMap((entry) => checkClass(entry, shelf.causes, known)),
    ...shelf.causes.flatMap((entry) => checkCause(entry, known)),
    ...shelf.fixes.flatMap((entry) => checkFix(entry, known)),
    ...shelf.cautions.flatMap((entry) =>
      checkSources(`caution ${entry.key}`, entry.sourceKey.trim() ? [entry.sourceKey] : [], known),
    ),
    ...shelf.sources.filter((entry) => !entry.citation.trim()).map((entry) => `source ${entry.key} has no citation`),
  ];
}

function checkTwice(shelf: Shelf): string[] {
  const kinds: [string, string[]][] = [
    ["class", shelf.classes.map((entry) => entry.slug)],
    ["cause", shelf.causes.map((entry) => entry.slug)],
    ["fix", shelf.fixes.map((entry) => entry.slug)],
    ["caution", shelf.cautions.map((entry) => entry.key)],
    ["source", shelf.sources.map((entry) => entry.key)],
  ];
  return kinds.flatMap(([kind, names]) =>
    names.filter((name, index) => names.indexOf(name) !== index).map((name) => `${kind} ${name} stands twice`),
  );
}

function checkClass(entry: LibraryClass, causes: readonly LibraryCause[], known: Known): string[] {
  const name = `class ${entry.slug}`;
  const own = causes.filter((cause) => cause.classSlugs.includes(entry.slug));
  const total = own.reduce((sum, cause) => sum + cause.likelihood, entry.otherLikelihood);
  const versus = entry.tells.map((tell) => tell.versus);
  return [
    ...checkSources(name, entry.sourceKeys, known),
    ...unknown(name, "class", versus, known.classes),
    ...(versus.includes(entry.slug) ? [`${name} is told from itself`] : []),
    ...(own.length > 0 && Math.abs(total - 1) > SHARE_TOLERANCE
      ? [`${name}: shares of its causes and 'other' sum to ${total.toFixed(2)}, not 1`]
      : []),
  ];
}

function checkCause(entry: LibraryCause, known: Known): string[] {
  const name = `cause ${entry.slug}`;
  return [
    ...checkSources(name, entry.sourceKeys, known),
    ...unknown(name, "class", entry.classSlugs, known.classes),
    ...(entry.classSlugs.length === 0 ? [`${name} belongs to no class`] : []),
    ...(entry.station ? [] : [`${name} has no station`]),
    ...(entry.baseMetals.length === 0 ? [`${name} names no base metal`] : []),
    ...(entry.likelihood > 0 && entry.likelihood <= 1 ? [] : [`${name}: its share must be above 0 and at most 1`]),
  ];
}

function checkFix(entry: LibraryFix, known: Known): string[] {
  const name = `fix ${entry.slug}`;
  return [
    ...checkSources(name, entry.sourceKeys, known),
    ...unknown(name, "cause", entry.causeSlugs, known.causes),
    ...(entry.causeSlugs.length === 0 ? [`${name} fixes no cause`] : []),
    ...(entry.steps.length === 0 ? [`${name} has no steps`] : []),
    ...entry.steps.flatMap((step, index) => {
      const place = `${name}, step ${index + 1}`;
      return [
        ...(step.detail.trim() ? [] : [`${place} says nothing`]),
        ...(step.minutes > 0 ? [] : [`${place} has no minutes`]),
        ...unknown(place, "caution", step.cautionKeys, known.cautions),
      ];
    }),
  ];
}

function checkSources(name: string, keys: readonly string[], known: Known): string[] {
  return keys.length === 0 ? [`${name} has no source`] : unknown(name, "source", keys, known.sources);
}

function unknown(name: string, kind: string, keys: readonly string[], known: ReadonlySet<string>): string[] {
  return keys.filter((key) => !known.has(key)).map((key) => `${name} points at an unknown ${kind}: ${key}`);
}
