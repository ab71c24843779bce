"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import type { FormEvent } from "react";
import { BESIDE_FORM, useBeside } from "@/components/cases/beside-picks";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import { LEAST_BESIDE, MOST_BESIDE } from "@/lib/cases/beside";
import { routes } from "@/lib/routes";

/** A case that may lie in the tray. */
export interface TrayCase {
  ref: string;
  classWords: string;
  photoId: string | null;
}

interface BesideTrayProps {
  /** The cases of the page and those of the address. */
  known: readonly TrayCase[];
  /** References that have a tick box on this page; the others are sent along unseen. */
  onPage: readonly string[];
}

/** What the tray says of how many lie in it. */
export function trayWords(count: number): string {
  if (count === 0) return "Tick two to four cases to see them side by side.";
  if (count < LEAST_BESIDE) return "Tick one more to compare.";
  const room = MOST_BESIDE - count;
  if (room === 0) return "The tray is full. Take one out for another.";
  return room === 1 ? "Room for one more." : `Room for ${room} more.`;
}

/** The picked cases and the way to compare them. Without script it lies at the foot of the list as a plain form. */
export function BesideTray({ known, onPage }: BesideTrayProps) {
  const { refs } = useBeside();
  const router = useRouter();
  const goThere = (event: FormEvent) => {
    event.preventDefault();
    router.push(routes.compare(refs));
  };
  return (
    <section className={refs.length > 0 ? "tray is-filled" : "tray"} aria-label="Side by side">
      <form id={BESIDE_FORM} action={routes.compare([]).split("?")[0]} className="tray__in" onSubmit={goThere}>
        <div className="tray__say">
          <h2>Side by side</h2>
          <p aria-live="polite">
            {refs.length > 0 && `${refs.length} of ${MOST_BESIDE}. `}
            {trayWords(refs.length)}
          </p>
        </div>
        {refs.length > 0 && (
          <ul>
            {refs.map((ref) => (
              <Picked
                key={ref}
                picked={known.find((each) => each.ref === ref) ?? { ref, classWords: "", photoId: null }}
              />
            ))}
          </ul>
        )}
        {refs
          .filter((ref) => !onPage.includes(ref))
          .map((ref) => (
            <input key={ref} type="hidden" name="refs" value={ref} />
          ))}
        <Button
          type="submit"
          variant={refs.length >= LEAST_BESIDE ? "main" : "plain"}
          glyph="ui-step"
          className="tray__go"
        >
          {refs.length >= LEAST_BESIDE ? `Compare ${refs.length} in step` : "Compare in step"}
        </Button>
      </form>
    </section>
  );
}

function Picked({ picked }: { picked: TrayCase }) {
  const { turn, withoutHref } = useBeside();
  const { ref, classWords, photoId } = picked;
  return (
    <li>
      <span className="shot">
        {photoId && <img src={routes.photo(photoId, "thumb")} alt="" width={56} height={56} />}
      </span>
      <span className="tray__words">
        <span className="ref">{ref}</span>
        <span>{classWords}</span>
      </span>
      <Link
        href={withoutHref(ref)}
        prefetch={false}
        scroll={false}
        replace
        aria-label={`Take ${ref} out`}
        onClick={(event) => {
          event.preventDefault();
          turn(ref);
        }}
      >
        <Glyph name="ui-cross" />
      </Link>
    </li>
  );
}
