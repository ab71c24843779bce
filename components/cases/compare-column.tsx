"use client";

import Link from "next/link";
import { useState } from "react";
import { classGlyph } from "@/components/cases/class-glyph";
import { StateMark } from "@/components/cases/state-mark";
import type { TagState } from "@/components/cases/tag-state";
import type { ChangeView } from "@/components/photos/photo-stage-view";
import { StageFrame, type StagePhoto } from "@/components/photos/stage-frame";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import type { StageView } from "@/lib/photos/stage-view";
import { routes } from "@/lib/routes";

/** A case of the comparison. */
export interface ComparedColumn {
  ref: string;
  classSlug: string | null;
  classWords: string;
  state: TagState;
  stateWords: string;
  photos: readonly StagePhoto[];
  /** The photo to begin with, from 0. */
  startAt: number;
}

interface CompareColumnProps {
  column: ComparedColumn;
  facts: readonly { label: string; value: string; isSame: boolean }[];
  view: StageView;
  setView: ChangeView;
  takesArrows: boolean;
  /** The tools move this one from now on, when the photos are out of step. */
  onTouch: () => void;
}

/** One case: its photo, and its facts in the rows that all cases share. */
export function CompareColumn({ column, facts, view, setView, takesArrows, onTouch }: CompareColumnProps) {
  const [shown, setShown] = useState(column.startAt);
  const { photos, ref } = column;
  const photo = photos[shown];
  const turn = (by: number) => setShown((shown + photos.length + by) % photos.length);
  return (
    <article className="compare__case" aria-label={ref} onPointerDown={onTouch} onFocus={onTouch}>
      <header>
        <Link className="ref solo" href={routes.case(ref)}>
          {ref}
        </Link>
        <StateMark state={column.state} words={column.stateWords} />
      </header>
      <h2>
        <Glyph name={classGlyph(column.classSlug)} />
        <span>{column.classWords}</span>
      </h2>
      <div className="compare__photo">
        {photo ? (
          <StageFrame
            photo={photo}
            words={`${shown + 1} of ${photos.length}`}
            view={view}
            setView={setView}
            takesArrows={takesArrows}
          />
        ) : (
          <p className="stage-none">No photo has come in yet.</p>
        )}
        {photos.length > 1 && (
          <div className="compare__turn">
            <Button glyph="ui-back" aria-label={`Photo before, ${ref}`} onClick={() => turn(-1)} />
            <Button glyph="ui-next" aria-label={`Next photo, ${ref}`} onClick={() => turn(1)} />
          </div>
        )}
      </div>
      <dl>
        {facts.map(({ label, value, isSame }) => (
          <div key={label} className={isSame ? undefined : "is-apart"}>
            <dt>{label}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </article>
  );
}
