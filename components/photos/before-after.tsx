"use client";

import { useState } from "react";
import type { CSSProperties } from "react";
import { Glyph } from "@/components/ui/glyph";
import { routes } from "@/lib/routes";

interface ComparedPhoto {
  id: string;
  /** "Round 1, held" */
  caption: string;
  placeholder?: string;
  isRendered: boolean;
}

const ARROW_STEP = 2;

/**
 * Two photos in one frame and a bar between them. The bar is a native slider: a finger drags it, arrow keys move it,
 * and readers hear how much of each is shown.
 */
export function BeforeAfter({ before, after }: { before: ComparedPhoto; after: ComparedPhoto }) {
  const [split, setSplit] = useState(50);
  return (
    <figure className="shot before-after" style={{ "--split": `${split}%` } as CSSProperties}>
      <BehindImage photo={before} alt={`Before: ${before.caption}`} />
      <BehindImage photo={after} alt={`After: ${after.caption}`} isAfter />
      <span className="before-after__bar" aria-hidden="true">
        <span className="before-after__grip">
          <Glyph name="ui-slide" />
        </span>
      </span>
      <input
        className="before-after__slider"
        type="range"
        min={0}
        max={100}
        step={ARROW_STEP}
        value={split}
        aria-label="How much of the photo before is shown"
        aria-valuetext={`${split} percent before, ${100 - split} percent after`}
        onChange={(event) => setSplit(Number(event.target.value))}
      />
      <span className="shot__cap">{before.caption}</span>
      <span className="shot__cap before-after__right">{after.caption}</span>
      {(before.isRendered || after.isRendered) && <span className="shot__demo">Rendered demo photos</span>}
    </figure>
  );
}

function BehindImage({ photo, alt, isAfter }: { photo: ComparedPhoto; alt: string; isAfter?: boolean }) {
  return (
    <img
      className={isAfter ? "before-after__img before-after__img--after" : "before-after__img"}
      src={routes.photo(photo.id, "view")}
      alt={alt}
      style={photo.placeholder ? { backgroundImage: `url("${photo.placeholder}")` } : undefined}
      decoding="async"
    />
  );
}
