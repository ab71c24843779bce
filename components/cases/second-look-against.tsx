import Link from "next/link";
import { classGlyph } from "@/components/cases/class-glyph";
import { classWords } from "@/components/cases/class-words";
import { Glyph } from "@/components/ui/glyph";
import { KeyCap } from "@/components/ui/key-cap";
import { PhotoFrame } from "@/components/ui/photo-frame";
import { Section } from "@/components/ui/section";
import { routes } from "@/lib/routes";

export interface AgainstClass {
  slug: string;
  title: string;
  /** How to tell it from what was called; for the called class itself, what it looks like. */
  tell: string;
  keyCap?: string;
  exemplar: { photoId: string; caseRef: string; placeholder?: string; isRendered: boolean } | null;
}

/** A class to hold the photo against: its clearest photo here, and how it is told. */
function ClassToCompare({ of }: { of: AgainstClass }) {
  const { exemplar } = of;
  return (
    <article className="against__class">
      <PhotoFrame
        className="in-step"
        ratio="364 / 186"
        src={exemplar ? routes.photo(exemplar.photoId, "view") : null}
        alt={`Exemplar of ${of.title.toLowerCase()}`}
        placeholder={exemplar?.placeholder}
        rendered={exemplar?.isRendered}
        missing={`No exemplar of ${of.title.toLowerCase()} chosen yet`}
        caption={exemplar ? `Exemplar, ${exemplar.caseRef}` : undefined}
      />
      <h3 className="against__name">
        {of.keyCap && <KeyCap>{of.keyCap}</KeyCap>}
        <Glyph name={classGlyph(of.slug)} size={24} />
        <Link href={routes.libraryClass(of.slug)}>{of.title}</Link>
      </h3>
      <p className="against__tell">{of.tell}</p>
    </article>
  );
}

/** The classes that it may be, side by side with the photo. */
export function Against({ classes }: { classes: readonly AgainstClass[] }) {
  return (
    <div className="against">
      {classes.map((each) => (
        <ClassToCompare key={each.slug} of={each} />
      ))}
    </div>
  );
}

export interface AlikeView {
  caseRef: string;
  classTitle: string;
  /** "sound in round 2" */
  end: string;
  photo: { id: string; placeholder?: string; isRendered: boolean } | null;
}

/** The shop's own closed cases that are most like this one. */
export function MostAlike({ cases, allHref }: { cases: readonly AlikeView[]; allHref: string }) {
  return (
    <Section title="Most alike here" aside={cases.length > 0 ? <Link href={allHref}>All of them</Link> : undefined}>
      {cases.length === 0 ? (
        <p className="small quiet">No closed case on this base metal looks like it yet.</p>
      ) : (
        <ul className="alike">
          {cases.map((each) => (
            <li key={each.caseRef}>
              <Link href={routes.case(each.caseRef)}>
                <PhotoFrame
                  ratio="1"
                  src={each.photo ? routes.photo(each.photo.id, "thumb") : null}
                  alt=""
                  placeholder={each.photo?.placeholder}
                />
                <b className="ref">{each.caseRef.replace(/^CT-/, "")}</b>
                {classWords(each.classTitle)}, {each.end}
              </Link>
            </li>
          ))}
        </ul>
      )}
    </Section>
  );
}
