import type { Role } from "@/lib/cases/case-words";
import type { GlyphName } from "@/components/ui/glyph-names";

interface PlaceEntry {
  slug: string;
  title: string;
  href: string;
  glyph: GlyphName;
  roles: readonly Role[];
  /** False: it stands in the Go-to sheet and not in the desktop bar, which is full. */
  bar?: boolean;
}

/** Where one can go, in the order of the bar. A person with several roles sees the places of all of them. */
export const PLACES = [
  { slug: "today", title: "Today", href: "/", glyph: "mark", roles: ["plater", "trainee", "senior", "owner"] },
  { slug: "snap", title: "Snap", href: "/cases/snap", glyph: "ui-camera", roles: ["plater", "trainee"] },
  {
    slug: "second-look",
    title: "Second look",
    href: "/cases/second-look",
    glyph: "ui-eye",
    roles: ["senior", "owner"],
  },
  { slug: "rework", title: "Rework", href: "/cases/rework", glyph: "ui-again", roles: ["plater", "senior", "owner"] },
  {
    slug: "casebook",
    title: "Casebook",
    href: "/cases",
    glyph: "ui-hold-tag",
    roles: ["plater", "trainee", "senior", "owner"],
  },
  {
    slug: "library",
    title: "Library",
    href: "/library",
    glyph: "ui-library",
    roles: ["plater", "trainee", "senior", "owner"],
  },
  {
    slug: "practice",
    title: "Practice",
    href: "/practice",
    glyph: "station-inspect",
    roles: ["plater", "trainee", "senior"],
  },
  {
    slug: "metals",
    title: "Part check",
    href: "/metals/check",
    glyph: "ui-part",
    roles: ["plater", "trainee", "senior", "owner"],
    bar: false,
  },
  { slug: "strip", title: "Strip", href: "/costs/strip", glyph: "station-strike", roles: ["senior", "owner"] },
  { slug: "ledger", title: "Ledger", href: "/costs", glyph: "ui-money", roles: ["owner"] },
  { slug: "crew", title: "Crew", href: "/crew", glyph: "ui-crew", roles: ["owner"] },
] as const satisfies readonly PlaceEntry[];

export type PlaceSlug = (typeof PLACES)[number]["slug"];

export interface PlaceView {
  slug: PlaceSlug;
  title: string;
  href: string;
  glyph: GlyphName;
  isInBar: boolean;
  /** How much waits there. */
  count?: number;
}

/** How much waits in which place; a place without a count shows none. */
export type PlaceCounts = Partial<Record<PlaceSlug, number>>;

/** The places of a person with these roles, in the order of the bar. */
export function placesFor(roles: readonly Role[], counts: PlaceCounts = {}): PlaceView[] {
  const places: readonly (PlaceEntry & { slug: PlaceSlug })[] = PLACES;
  return places
    .filter((place) => place.roles.some((role) => roles.includes(role)))
    .map((place) => ({
      slug: place.slug,
      title: place.title,
      href: place.href,
      glyph: place.glyph,
      isInBar: place.bar ?? true,
      count: counts[place.slug],
    }));
}
