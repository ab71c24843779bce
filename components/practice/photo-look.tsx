"use client";

import { useRef, useState } from "react";
import { toggleTwice, useArrowPan, usePointerPan, useWheelZoom } from "@/components/photos/photo-stage-gestures";
import { stageVariables } from "@/components/photos/photo-stage-view";
import { Button } from "@/components/ui/button";
import { WHOLE_PHOTO } from "@/lib/photos/stage-view";

export interface PhotoLookProps {
  /** Through the question, never the photo's own address. */
  src: string;
  /** Says what a plater knows at the tank, nothing more. */
  caption: string;
  isRendered: boolean;
  alt: string;
}

/** The photo of a question, large: drag, pinch, Ctrl and wheel, arrow keys and Z look closer. */
export function PhotoLook({ src, caption, isRendered, alt }: PhotoLookProps) {
  const frame = useRef<HTMLElement>(null);
  const [view, setView] = useState(WHOLE_PHOTO);
  const [isLost, setLost] = useState(false);
  const panning = usePointerPan(setView);
  useWheelZoom(frame, setView);
  useArrowPan(frame, view, setView);
  return (
    <div className="practice-look">
      <figure
        ref={frame}
        className={view.zoom > 1 ? "shot stage is-near" : "shot stage"}
        style={stageVariables(view)}
        {...panning}
      >
        {isLost ? (
          <span className="shot__missing">The photo did not come through. Reload the page; nothing is lost.</span>
        ) : (
          <img
            className="stage__img"
            src={src}
            alt={alt}
            draggable={false}
            fetchPriority="high"
            onError={() => setLost(true)}
          />
        )}
        <figcaption className="shot__cap">{caption}</figcaption>
        {isRendered && <span className="shot__demo">Rendered demo photo</span>}
        {view.zoom > 1 && <span className="stage__where" aria-hidden="true" />}
      </figure>
      <Button
        className="practice-look__zoom"
        glyph="ui-zoom"
        keyCap="Z"
        aria-pressed={view.zoom > 1}
        onClick={() => setView(toggleTwice)}
      >
        {view.zoom > 1 ? "1×" : "2×"}
      </Button>
    </div>
  );
}
