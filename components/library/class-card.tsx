import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { counted } from "@/lib/cases/part-words";
import { routes } from "@/lib/routes";

export interface ClassCardProps {
  slug: string;
  title: string;
  short: string;
  /** Confirmed as this class in this shop. */
  cases: number;
  exemplar: { photoId: string; placeholder?: string } | null;
}

/** A class on the shelf: its clearest photo, its picture and name, one line, how often it was seen here. */
export function ClassCard({ slug, title, short, cases, exemplar }: ClassCardProps) {
  return (
    <article className="class-card">
      <PhotoFrame
        ratio="3 / 2"
        src={exemplar ? routes.photo(exemplar.photoId, "thumb") : null}
        alt=""
        placeholder={exemplar?.placeholder}
        missing="No exemplar chosen yet"
      />
      <div className="class-card__words">
        <h3>
          <Glyph name={classGlyph(slug)} />
          <Link href={routes.libraryClass(slug)}>{title}</Link>
        </h3>
        <p>{short}</p>
        <p className="class-card__cases">{cases === 0 ? "No case here yet" : `${counted(cases, "case")} here`}</p>
      </div>
    </article>
  );
}
