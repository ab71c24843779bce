"use client";

import { useCallback, useState } from "react";
import { toggleTwice } from "@/components/photos/photo-stage-gestures";
import { useInStep, type ChangeView } from "@/components/photos/photo-stage-view";
import { StageFrame, type StagePhoto } from "@/components/photos/stage-frame";
import { Button } from "@/components/ui/button";
import { MOST_ZOOM, WHOLE_PHOTO, zoomTo, type StageView } from "@/lib/photos/stage-view";
import { routes } from "@/lib/routes";

export type { StagePhoto };

interface PhotoStageProps {
  photos: readonly StagePhoto[];
  /** Number of the photo to begin with, from 0. */
  startAt?: number;
  /** Without the film, where the page has its own. */
  hideFilm?: boolean;
}

/**
 * One photo large, with zoom and pan, the others on a film strip. "In step" keeps place and size from photo to photo,
 * and takes the exemplars beside it along.
 */
export function PhotoStage({ photos, startAt = 0, hideFilm }: PhotoStageProps) {
  const [shown, setShown] = useState(startAt);
  const { view, setView, isInStep, setInStep } = useStageView(shown);
  const photo = photos[shown] ?? photos[0];
  if (!photo) return <p className="stage-none">No photo has come in yet.</p>;

  return (
    <div className="stage-set">
      <StageFrame photo={photo} words={`${shown + 1} of ${photos.length}`} view={view} setView={setView} />
      <div className="stage-tools">
        {photos.length > 1 && (
          <>
            <Button
              className="stage-tools__turn"
              glyph="ui-back"
              keyCap="["
              aria-label="Photo before"
              onClick={() => setShown((shown + photos.length - 1) % photos.length)}
            />
            <Button
              className="stage-tools__turn"
              glyph="ui-next"
              keyCap="]"
              aria-label="Next photo"
              onClick={() => setShown((shown + 1) % photos.length)}
            />
          </>
        )}
        <Button glyph="ui-step" keyCap="S" aria-pressed={isInStep} onClick={() => setInStep(!isInStep)}>
          In step
        </Button>
        <Button glyph="ui-zoom" keyCap="Z" aria-pressed={view.zoom > 1} onClick={() => setView(toggleTwice)}>
          {view.zoom > 1 ? `${view.zoom.toFixed(view.zoom % 1 === 0 ? 0 : 1)}×` : "2×"}
        </Button>
        <Button
          className="stage-tools__closer"
          aria-label="Closer"
          disabled={view.zoom >= MOST_ZOOM}
          glyph="ui-plus"
          keyCap="+"
          onClick={() => setView((now) => zoomTo(now, now.zoom + 1))}
        />
      </div>
      {!hideFilm && photos.length > 1 && <Film photos={photos} shown={shown} onShow={setShown} />}
    </div>
  );
}

/** In step there is one view for all photos; out of step each keeps its own. */
function useStageView(shown: number) {
  const around = useInStep();
  const [own, setOwn] = useState(WHOLE_PHOTO);
  const [each, setEach] = useState<Record<number, StageView>>({});
  const [alone, setAlone] = useState(true);
  const isInStep = around ? around.isInStep : alone;
  const setOne: ChangeView = useCallback(
    (change) => setEach((before) => ({ ...before, [shown]: change(before[shown] ?? WHOLE_PHOTO) })),
    [shown],
  );
  return {
    view: isInStep ? (around?.view ?? own) : (each[shown] ?? WHOLE_PHOTO),
    setView: isInStep ? (around?.setView ?? setOwn) : setOne,
    isInStep,
    setInStep: around?.setInStep ?? setAlone,
  };
}

interface FilmProps {
  photos: readonly StagePhoto[];
  shown: number;
  onShow: (index: number) => void;
}

function Film({ photos, shown, onShow }: FilmProps) {
  return (
    <ol className="stage-film" aria-label="Photos of this case">
      {photos.map((photo, index) => (
        <li key={photo.id}>
          <button
            type="button"
            className="shot"
            aria-current={index === shown ? "true" : undefined}
            onClick={() => onShow(index)}
          >
            {photo.missing ? (
              <span className="shot__missing">Not here yet</span>
            ) : (
              <img src={routes.photo(photo.id, "thumb")} alt="" loading="lazy" decoding="async" />
            )}
            <span className="shot__cap">{photo.caption}</span>
          </button>
        </li>
      ))}
    </ol>
  );
}
