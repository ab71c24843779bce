import { SHELF_CLASSES, type StationKind } from "@/lib/cases/case-words";
import type { GlyphName } from "@/components/ui/glyph-names";

/** The picture of a defect class. A class of the shop's own has one for all; null is "can't tell". */
export function classGlyph(slug: string | null): GlyphName {
  if (slug === null) return "not-enough";
  return SHELF_CLASSES.find((shelfClass) => shelfClass === slug) ?? "own-class";
}

/** The picture of a station. */
export function stationGlyph(kind: StationKind): GlyphName {
  return `station-${kind}`;
}
