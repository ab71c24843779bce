"use client";

import { useRef, useState } from "react";
import { useArrowPan, usePointerPan, useWheelZoom } from "@/components/photos/photo-stage-gestures";
import { stageVariables, type ChangeView } from "@/components/photos/photo-stage-view";
import type { StageView } from "@/lib/photos/stage-view";
import { routes } from "@/lib/routes";

export interface StagePhoto {
  id: string;
  /** "1 · the snap": on the photo and under its thumb. */
  caption: string;
  /** What a reader is told of the picture. */
  alt: string;
  placeholder?: string;
  isRendered: boolean;
  /** Why there is nothing to look at, where the photo is not ready. */
  missing?: string;
}

/** From here on the view size has no more to show, and the original is fetched. */
const SHARP_FROM_ZOOM = 2;

interface StageFrameProps {
  photo: StagePhoto;
  /** "2 of 3" */
  words: string;
  view: StageView;
  setView: ChangeView;
  /** Whether arrow keys anywhere on the page move it: of several frames that share a view only one may listen. */
  takesArrows?: boolean;
}

/** A photo in its frame, with zoom and pan by finger, mouse, wheel and arrow keys. */
export function StageFrame({ photo, words, view, setView, takesArrows = true }: StageFrameProps) {
  const frame = useRef<HTMLElement>(null);
  const panning = usePointerPan(setView);
  useWheelZoom(frame, setView);
  useArrowPan(frame, view, setView, takesArrows);
  return (
    <figure
      ref={frame}
      className={view.zoom > 1 ? "shot stage is-near" : "shot stage"}
      style={stageVariables(view)}
      {...(photo.missing ? {} : panning)}
    >
      {photo.missing ? (
        <span className="shot__missing">{photo.missing}</span>
      ) : (
        <StageImage key={photo.id} photo={photo} isNear={view.zoom > SHARP_FROM_ZOOM} />
      )}
      <figcaption className="shot__cap">
        {words} · {photo.caption}
      </figcaption>
      {photo.isRendered && !photo.missing && <span className="shot__demo">Rendered demo photo</span>}
      {view.zoom > 1 && <span className="stage__where" aria-hidden="true" />}
    </figure>
  );
}

/** The view size at once; the original over it when one looks closer than the view size can show. */
function StageImage({ photo, isNear }: { photo: StagePhoto; isNear: boolean }) {
  const [original, setOriginal] = useState<"coming" | "here" | "failed">("coming");
  const behind = photo.placeholder ? { backgroundImage: `url("${photo.placeholder}")` } : undefined;
  return (
    <>
      <img
        className="stage__img"
        src={routes.photo(photo.id, "view")}
        alt={photo.alt}
        style={behind}
        draggable={false}
        fetchPriority="high"
      />
      {isNear && original !== "failed" && (
        <img
          className={original === "here" ? "stage__img" : "stage__img is-coming"}
          src={routes.photo(photo.id, "original")}
          alt=""
          draggable={false}
          onLoad={() => setOriginal("here")}
          onError={() => setOriginal("failed")}
        />
      )}
    </>
  );
}
