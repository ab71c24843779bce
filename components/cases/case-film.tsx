"use client";

import { useState } from "react";
import { FaultNote } from "@/components/cases/fault-note";
import { useSend, type FormAct } from "@/components/cases/use-send";
import { PhotoStage, type StagePhoto } from "@/components/photos/photo-stage";
import { Dialog } from "@/components/ui/dialog";
import { Glyph } from "@/components/ui/glyph";
import { SubmitButton } from "@/components/ui/submit-button";
import { routes } from "@/lib/routes";

export interface FilmShot {
  photo: StagePhoto;
  round: number;
  /** Whether it shows the confirmed class at its clearest. */
  isExemplar: boolean;
}

interface CaseFilmProps {
  caseRef: string;
  shots: readonly FilmShot[];
  /** Left out for those who may not choose, and while no class is confirmed. */
  onExemplar?: FormAct<{ ref: string }>;
}

/** All photos of a case by round. One press shows a photo large, with zoom and pan. */
export function CaseFilm({ caseRef, shots, onExemplar }: CaseFilmProps) {
  const [open, setOpen] = useState<number | null>(null);
  const rounds = [...new Set(shots.map((shot) => shot.round))];
  return (
    <>
      <div className="case-film">
        {rounds.map((round) => (
          <div className="case-film__round" key={round}>
            <h3>Round {round}</h3>
            <ol>
              {shots.map((shot, index) =>
                shot.round === round ? (
                  <li key={shot.photo.id}>
                    <Frame shot={shot} onOpen={() => setOpen(index)} />
                    {onExemplar && !shot.photo.missing && (
                      <ExemplarToggle caseRef={caseRef} shot={shot} action={onExemplar} />
                    )}
                  </li>
                ) : null,
              )}
            </ol>
          </div>
        ))}
      </div>
      <Dialog open={open !== null} onClose={() => setOpen(null)} title={`Photos of ${caseRef}`} size="wide">
        {open !== null && <PhotoStage photos={shots.map((shot) => shot.photo)} startAt={open} />}
      </Dialog>
    </>
  );
}

function Frame({ shot, onOpen }: { shot: FilmShot; onOpen: () => void }) {
  const { photo, isExemplar } = shot;
  if (photo.missing) return <p className="case-film__missing">{photo.missing}</p>;
  return (
    <>
      <button
        type="button"
        className="shot case-film__shot"
        aria-label={`${photo.alt}, show large`}
        style={photo.placeholder ? { backgroundImage: `url("${photo.placeholder}")` } : undefined}
        onClick={onOpen}
      >
        <img src={routes.photo(photo.id, "thumb")} alt="" loading="lazy" decoding="async" />
      </button>
      <span className="case-film__words">
        {photo.caption}
        {isExemplar && (
          <b>
            <Glyph name="ui-tick" size={20} /> Exemplar
          </b>
        )}
      </span>
    </>
  );
}

interface ToggleProps {
  caseRef: string;
  shot: FilmShot;
  action: FormAct<{ ref: string }>;
}

/** A senior chooses the photos that show a class at its clearest. */
function ExemplarToggle({ caseRef, shot, action }: ToggleProps) {
  const { state, isBusy, form } = useSend(action);
  const words = shot.isExemplar ? "Take it off" : "Make exemplar";
  return (
    <form {...form}>
      <input type="hidden" name="ref" value={caseRef} />
      <input type="hidden" name="photoId" value={shot.photo.id} />
      <input type="hidden" name="chosen" value={String(!shot.isExemplar)} />
      <SubmitButton variant="quiet" busy={isBusy} aria-label={`${words}: ${shot.photo.alt}`}>
        {words}
      </SubmitButton>
      <FaultNote state={state} />
    </form>
  );
}
