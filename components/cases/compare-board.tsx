"use client";

import Link from "next/link";
import { useRef } from "react";
import type { CSSProperties } from "react";
import { CompareColumn, type ComparedColumn } from "@/components/cases/compare-column";
import { useCompareViews } from "@/components/cases/use-compare-views";
import { toggleTwice } from "@/components/photos/photo-stage-gestures";
import { Button } from "@/components/ui/button";
import type { FactRow } from "@/lib/cases/compare-facts";
import { MOST_ZOOM, WHOLE_PHOTO, zoomTo } from "@/lib/photos/stage-view";

interface CompareBoardProps {
  columns: readonly ComparedColumn[];
  rows: readonly FactRow[];
  /** Back to the casebook with these cases still picked. */
  changeHref: string;
}

/** Cases side by side: photos in step, facts in rows. On a phone two are in sight and the rail steps on. */
export function CompareBoard({ columns, rows, changeHref }: CompareBoardProps) {
  const rail = useRef<HTMLDivElement>(null);
  const { viewOf, setterOf, active, setActive, isInStep, setInStep } = useCompareViews();
  const view = viewOf(active);
  const setView = setterOf(active);
  const step = (by: number) =>
    rail.current?.scrollBy({ left: (by * rail.current.clientWidth) / 2, behavior: "smooth" });
  return (
    <div className="compare" style={{ "--cases": columns.length, "--facts": rows.length } as CSSProperties}>
      <div className="stage-tools compare__tools" role="group" aria-label="Photos">
        <Button glyph="ui-step" keyCap="S" aria-pressed={isInStep} onClick={() => setInStep(!isInStep)}>
          In step
        </Button>
        <Button glyph="ui-zoom" keyCap="Z" aria-pressed={view.zoom > 1} onClick={() => setView(toggleTwice)}>
          {view.zoom > 1 ? `${view.zoom.toFixed(view.zoom % 1 === 0 ? 0 : 1)}×` : "2×"}
        </Button>
        <Button
          glyph="ui-plus"
          keyCap="+"
          disabled={view.zoom >= MOST_ZOOM}
          onClick={() => setView((now) => zoomTo(now, now.zoom + 1))}
        >
          Closer
        </Button>
        <Button keyCap="0" disabled={view.zoom === 1} onClick={() => setView(() => WHOLE_PHOTO)}>
          Whole
        </Button>
        <Link className="solo compare__change" href={changeHref}>
          Change the cases
        </Link>
      </div>
      <div className="compare__rail" ref={rail}>
        {columns.map((column, index) => (
          <CompareColumn
            key={column.ref}
            column={column}
            facts={rows.map((row) => ({ label: row.label, value: row.values[index] ?? "", isSame: row.isSame }))}
            view={viewOf(index)}
            setView={setterOf(index)}
            takesArrows={index === (isInStep ? 0 : active)}
            onTouch={() => setActive(index)}
          />
        ))}
      </div>
      {columns.length > 2 && (
        <div className="compare__steps">
          <Button glyph="ui-back" onClick={() => step(-1)}>
            Case before
          </Button>
          <Button glyph="ui-next" onClick={() => step(1)}>
            Next case
          </Button>
        </div>
      )}
    </div>
  );
}
