"use client";

import { createContext, useContext, useMemo, useState } from "react";
import type { CSSProperties, ReactNode } from "react";
import { WHOLE_PHOTO, type StageView } from "@/lib/photos/stage-view";

type StageVariables = CSSProperties & Record<"--zoom" | "--at-x" | "--at-y", number>;

/** A view as CSS variables; photo-stage.css turns them into the transform of every photo below. */
export function stageVariables({ zoom, x, y }: StageView): StageVariables {
  return { "--zoom": zoom, "--at-x": x, "--at-y": y };
}

/** Changes the view from what it is by then: several moves may come before the next drawing. */
export type ChangeView = (change: (view: StageView) => StageView) => void;

interface InStep {
  view: StageView;
  setView: ChangeView;
  isInStep: boolean;
  setInStep: (isInStep: boolean) => void;
}

const InStepContext = createContext<InStep | null>(null);

/** The view that the stage shares with its surroundings; null where it stands alone. */
export function useInStep(): InStep | null {
  return useContext(InStepContext);
}

/**
 * Photos with the class `in-step` inside follow the stage while "In step" is on: the same place, as large. Only this
 * wrapper's style changes as the stage moves; what is inside is not drawn again.
 */
export function InStepArea({ className, children }: { className?: string; children: ReactNode }) {
  const [view, setView] = useState(WHOLE_PHOTO);
  const [isInStep, setInStep] = useState(true);
  const shared = useMemo(() => ({ view, setView, isInStep, setInStep }), [view, isInStep]);
  return (
    <InStepContext value={shared}>
      <div className={className} style={stageVariables(isInStep ? view : WHOLE_PHOTO)}>
        {children}
      </div>
    </InStepContext>
  );
}
