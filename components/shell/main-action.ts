import type { GlyphName } from "@/components/ui/glyph-names";

interface MainActionWords {
  label: string;
  glyph?: GlyphName;
  keyCap?: string;
}

/** A screen's one main action: it goes somewhere, or it submits the form with that id. */
export type MainAction = MainActionWords & ({ href: string } | { form: string });
