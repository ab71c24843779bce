"use client";

import Link from "next/link";
import { useRef } from "react";
import { GO_TO_ID } from "@/components/shell/go-to-id";
import type { PlaceSlug, PlaceView } from "@/components/shell/places";
import { Glyph } from "@/components/ui/glyph";

/** The sheet of places. A popover: the browser opens it and closes it on Escape or a press beside it, without script. */
export function GoToSheet({ places, here }: { places: readonly PlaceView[]; here: PlaceSlug | null }) {
  const sheet = useRef<HTMLDialogElement>(null);
  return (
    <dialog ref={sheet} id={GO_TO_ID} popover="auto" className="go-to" aria-label="Go to">
      <nav aria-label="All places">
        <ul>
          {places.map((place) => (
            <li key={place.slug}>
              <Link
                href={place.href}
                aria-current={place.slug === here ? "page" : undefined}
                onClick={() => sheet.current?.hidePopover()}
              >
                <Glyph name={place.glyph} size={28} />
                {place.title}
                {place.count ? <span className="waits">{place.count}</span> : null}
              </Link>
            </li>
          ))}
          <li>
            <Link href="/cases#find" onClick={() => sheet.current?.hidePopover()}>
              <Glyph name="ui-find" size={28} />
              Find
            </Link>
          </li>
        </ul>
      </nav>
      <button type="button" className="btn btn--plain btn--wide" popoverTarget={GO_TO_ID} popoverTargetAction="hide">
        <Glyph name="ui-cross" />
        Close
      </button>
    </dialog>
  );
}
