import type { ReactNode } from "react";
import { Glyph } from "@/components/ui/glyph";
import type { GlyphName } from "@/components/ui/glyph-names";

export type NoteTone = "amber" | "rust" | "green" | "blue" | "grey";

const TONE_GLYPHS: Record<NoteTone, GlyphName> = {
  amber: "ui-caution",
  rust: "ui-stop",
  green: "ui-tick",
  blue: "ui-eye",
  grey: "ui-hold-tag",
};

export interface NoteProps {
  tone?: NoteTone;
  /** The tone brings its own. */
  glyph?: GlyphName;
  /** What happened, in a few words. */
  title: string;
  /** What to do about it. */
  children?: ReactNode;
  /** `alert` for what came up after the page was read: a refused form, a lost save. */
  role?: "alert" | "status";
  className?: string;
}

/** Something the person should know before they go on: edge shape, glyph and words say it, colour comes last. */
export function Note({ tone = "grey", glyph, title, children, role, className }: NoteProps) {
  return (
    <div className={`note note--${tone}${className ? ` ${className}` : ""}`} role={role}>
      <Glyph name={glyph ?? TONE_GLYPHS[tone]} />
      <div className="note__words">
        <strong className="note__title">{title}</strong>
        {children}
      </div>
    </div>
  );
}
