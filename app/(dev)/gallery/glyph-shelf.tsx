import { Glyph } from "@/components/ui/glyph";
import { GLYPH_NAMES } from "@/components/ui/glyph-names";
import { Section } from "@/components/ui/section";

/** Every picture of the sprite, at 44 and at 20 px. */
export function GlyphShelf() {
  return (
    <Section
      title="Glyphs"
      aside="Solid disc: copper is there, gaps are bare. Open ring: something lies on or under it."
    >
      <ul className="grid grid-cols-2 tablet:grid-cols-4 desk:grid-cols-7 gap-4">
        {GLYPH_NAMES.map((name) => (
          <li key={name} className="flex min-w-0 flex-wrap items-center gap-2 text-sm">
            <Glyph name={name} size={44} />
            <Glyph name={name} size={20} />
            {name}
          </li>
        ))}
      </ul>
    </Section>
  );
}
