import Link from "next/link";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { routes } from "@/lib/routes";

/** A case that is like the one on the page. */
export interface AlikeView {
  ref: string;
  classWords: string;
  photo: { id: string; isRendered: boolean } | null;
  /** "Same class; brass too" */
  why: string;
}

/** The cases most like this one, each with why, and a way to set it beside this one. */
export function AlikeCases({ caseRef, alike }: { caseRef: string; alike: readonly AlikeView[] }) {
  return (
    <ul className="alike-cases">
      {alike.map(({ ref, classWords, photo, why }) => (
        <li key={ref}>
          <PhotoFrame
            src={photo && routes.photo(photo.id, "thumb")}
            alt=""
            missing="No photo"
            caption={photo?.isRendered ? "Rendered" : undefined}
          />
          <div>
            <Link className="ref solo" href={routes.case(ref)} prefetch={false}>
              {ref}
            </Link>
            <p>{classWords}</p>
            <p className="alike-cases__why">{why}</p>
            <Link className="solo small" href={routes.compare([caseRef, ref])} prefetch={false}>
              Set beside<span className="sr-only">: {ref}</span>
            </Link>
          </div>
        </li>
      ))}
    </ul>
  );
}
