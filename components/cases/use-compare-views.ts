"use client";

import { useMemo, useState } from "react";
import type { ChangeView } from "@/components/photos/photo-stage-view";
import { WHOLE_PHOTO, type StageView } from "@/lib/photos/stage-view";

/** In step there is one view for all cases; out of step each keeps its own, and the tools move the one last touched. */
export function useCompareViews() {
  const [shared, setShared] = useState(WHOLE_PHOTO);
  const [each, setEach] = useState<Record<number, StageView>>({});
  const [isInStep, setInStep] = useState(true);
  const [active, setActive] = useState(0);
  // One setter a column, made once: a wheel listener is hung up anew whenever its setter changes.
  const setters = useMemo(() => new Map<number, ChangeView>(), []);
  const setterOf = (index: number): ChangeView => {
    if (isInStep) return setShared;
    const ready = setters.get(index);
    if (ready) return ready;
    const made: ChangeView = (change) =>
      setEach((before) => ({ ...before, [index]: change(before[index] ?? WHOLE_PHOTO) }));
    setters.set(index, made);
    return made;
  };
  return {
    viewOf: (index: number) => (isInStep ? shared : (each[index] ?? WHOLE_PHOTO)),
    setterOf,
    active,
    setActive,
    isInStep,
    setInStep,
  };
}
