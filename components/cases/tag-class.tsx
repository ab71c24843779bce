import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";

export interface TagClassProps {
  /** Null: can't tell. */
  slug: string | null;
  words: string;
  href?: string;
  /** Makes it a heading. */
  level?: 2 | 3;
}

/** The class line of an upright tag: its picture and its name. */
export function TagClass({ slug, words, href, level }: TagClassProps) {
  const Line = level ? (`h${level}` as const) : "p";
  return (
    <Line className="tag__cls">
      <Glyph name={classGlyph(slug)} />
      {href ? <Link href={href}>{words}</Link> : <span>{words}</span>}
    </Line>
  );
}
