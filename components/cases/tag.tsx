import Link from "next/link";
import type { CSSProperties, ReactNode } from "react";
import { classGlyph } from "@/components/cases/class-glyph";
import { StateMark } from "@/components/cases/state-mark";
import type { TagState } from "@/components/cases/tag-state";
import { Glyph } from "@/components/ui/glyph";

export interface TagPhoto {
  src: string;
  alt: string;
  /** Data URL from the thumbhash. */
  placeholder?: string;
}

export interface TagProps {
  /** CT-2607-0042 */
  caseRef: string;
  /** Where the tag leads; without it the tag only hangs there. */
  href?: string;
  state: TagState;
  /** "Held 38 min", "Card ready", "Step 3 of 5". */
  stateWords: string;
  /** Null: can't tell. A class of the shop's own gets the picture for those. */
  classSlug: string | null;
  /** "Underactivation?" while it is a first call, without the mark once confirmed. */
  classWords: string;
  /** "3 of 48 shells, brass". */
  meta: string;
  photo?: TagPhoto;
  /** Money at risk, already in words: "$412". Only for those who may see money. */
  stake?: string;
  /** In rework: share of the steps ticked, 0 to 1; the teeth fill. */
  progress?: number;
  /** The one that is open beside the list. */
  current?: boolean;
  /** It was hung a moment ago: swings in once. */
  fresh?: boolean;
}

/** Spoken form of the picture and the money end of a tag. */
function TagEnd({ photo, stake }: Pick<TagProps, "photo" | "stake">) {
  return (
    <>
      {stake && (
        <span className="tag__stake">
          {stake}
          <small> at risk</small>
        </span>
      )}
      {photo && (
        <span
          className="tag__pic"
          style={photo.placeholder ? { backgroundImage: `url("${photo.placeholder}")` } : undefined}
        >
          <img src={photo.src} alt={photo.alt} width={62} height={62} loading="lazy" decoding="async" />
        </span>
      )}
    </>
  );
}

/** One case as it hangs in a list. The tail tells the state by shape, the words beside the ref say it. */
export function Tag(props: TagProps) {
  const { caseRef, href, state, stateWords, classSlug, classWords, meta, photo, stake, progress = 0 } = props;
  const className = ["tag", `tag--${state}`, props.current && "is-current", props.fresh && "is-fresh"]
    .filter(Boolean)
    .join(" ");
  const paper: ReactNode = (
    <span className="tag__paper">
      <span className="tag__top">
        <span className="ref">{caseRef}</span>
        <StateMark state={state} words={stateWords} />
      </span>
      <span className="tag__cls">
        <Glyph name={classGlyph(classSlug)} />
        <span>{classWords}</span>
      </span>
      <span className="tag__meta">{meta}</span>
      <TagEnd photo={photo} stake={stake} />
      <span className="tag__tail" aria-hidden="true" />
    </span>
  );
  const style = { "--done": progress } as CSSProperties;
  if (!href) {
    return (
      <div className={className} style={style}>
        {paper}
      </div>
    );
  }
  return (
    <Link className={className} style={style} href={href} aria-current={props.current ? "true" : undefined}>
      {paper}
    </Link>
  );
}
