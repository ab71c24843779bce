import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { routes } from "@/lib/routes";

export interface ExemplarView {
  photoId: string;
  placeholder?: string;
  isRendered: boolean;
}

export interface TellView {
  /** The look-alike. */
  slug: string;
  title: string;
  tell: string;
  exemplar: ExemplarView | null;
  /** Exemplars of both classes side by side, in step; null while one of the two has none. */
  besideHref?: string | null;
}

function Half({ title, exemplar }: { title: string; exemplar: ExemplarView | null }) {
  return (
    <PhotoFrame
      ratio="3 / 2"
      src={exemplar ? routes.photo(exemplar.photoId, "thumb") : null}
      alt={`Exemplar of ${title.toLowerCase()}`}
      placeholder={exemplar?.placeholder}
      missing={`No exemplar of ${title.toLowerCase()}`}
      caption={exemplar ? title : undefined}
    />
  );
}

interface TellPairProps {
  own: { title: string; exemplar: ExemplarView | null };
  tell: TellView;
}

/** A look-alike: this class on the left, it on the right, and what tells them apart. */
export function TellPair({ own, tell }: TellPairProps) {
  return (
    <article className="tell">
      {(own.exemplar || tell.exemplar) && (
        <div className="pair">
          <Half title={own.title} exemplar={own.exemplar} />
          <Half title={tell.title} exemplar={tell.exemplar} />
        </div>
      )}
      <h3>
        <Glyph name={classGlyph(tell.slug)} />
        <Link href={routes.libraryClass(tell.slug)}>{tell.title}</Link>
      </h3>
      <p>{tell.tell}</p>
      {tell.besideHref && (
        <Link className="solo small" href={tell.besideHref} prefetch={false}>
          Set beside its look-alike<span className="sr-only">: {tell.title.toLowerCase()}</span>
        </Link>
      )}
    </article>
  );
}
