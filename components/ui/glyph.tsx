import type { GlyphName } from "@/components/ui/glyph-names";
import sprite from "@/components/ui/glyphs.svg";

export interface GlyphProps {
  name: GlyphName;
  /** Edge in px; the design's floor is 20. Without it the glyph is one and a half times the text beside it. */
  size?: number;
  /** Only where no word stands beside the glyph. */
  label?: string;
  className?: string;
}

/**
 * One picture out of the sprite, in the colour of the text around it. The sprite is imported, not served from public,
 * so that its address changes with its content and browsers keep it: pictures still show when the signal is gone.
 */
export function Glyph({ name, size, label, className }: GlyphProps) {
  const naming = label ? { role: "img", "aria-label": label } : { "aria-hidden": true };
  return (
    <svg
      className={className ? `g ${className}` : "g"}
      style={size ? { width: size, height: size } : undefined}
      {...naming}
    >
      <use href={`${sprite.src}#${name}`} />
    </svg>
  );
}
