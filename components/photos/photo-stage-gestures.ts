"use client";

import { useEffect, useRef } from "react";
import type { MouseEvent, PointerEvent, RefObject } from "react";
import type { ChangeView } from "@/components/photos/photo-stage-view";
import { dragBy, panByKey, WHOLE_PHOTO, zoomTo, type StageView } from "@/lib/photos/stage-view";

const TWICE = 2;
const WHEEL_STEP = 1.2;

/** 2× and back to the whole photo. */
export function toggleTwice(view: StageView): StageView {
  return view.zoom > 1 ? WHOLE_PHOTO : zoomTo(view, TWICE);
}

interface Point {
  x: number;
  y: number;
}

/** Where a pointer is, as shares of the frame. */
function shareOf(frame: Element, at: { clientX: number; clientY: number }): Point {
  const box = frame.getBoundingClientRect();
  return { x: (at.clientX - box.left) / box.width, y: (at.clientY - box.top) / box.height };
}

function between(points: Map<number, Point>): { distance: number; middle: Point } | null {
  const [a, b] = [...points.values()];
  if (!a || !b) return null;
  return { distance: Math.hypot(a.x - b.x, a.y - b.y), middle: { x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 } };
}

/** One finger or the mouse drags, two fingers pinch, a double press goes to 2× where it was pressed. */
export function usePointerPan(setView: ChangeView) {
  const down = useRef(new Map<number, Point>());
  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.pointerType === "mouse" && event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      down.current.set(event.pointerId, shareOf(event.currentTarget, event));
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      const from = down.current.get(event.pointerId);
      if (!from) return;
      const to = shareOf(event.currentTarget, event);
      const before = between(down.current);
      down.current.set(event.pointerId, to);
      const after = between(down.current);
      if (before && after && before.distance > 0) {
        setView((view) => zoomTo(view, (view.zoom * after.distance) / before.distance, after.middle));
      } else {
        setView((view) => dragBy(view, to.x - from.x, to.y - from.y));
      }
    },
    onPointerUp: (event: PointerEvent<HTMLElement>) => void down.current.delete(event.pointerId),
    onPointerCancel: (event: PointerEvent<HTMLElement>) => void down.current.delete(event.pointerId),
    onDoubleClick: (event: MouseEvent<HTMLElement>) => {
      const at = shareOf(event.currentTarget, event);
      setView((view) => (view.zoom > 1 ? WHOLE_PHOTO : zoomTo(view, TWICE, at)));
    },
  };
}

/** Ctrl and the wheel (a pinch on a touch pad sends the same) zoom; the wheel alone goes on scrolling the page. */
export function useWheelZoom(frame: RefObject<HTMLElement | null>, setView: ChangeView) {
  useEffect(() => {
    const element = frame.current;
    if (!element) return;
    const zoom = (event: WheelEvent) => {
      if (!event.ctrlKey && !event.metaKey) return;
      event.preventDefault();
      const factor = event.deltaY < 0 ? WHEEL_STEP : 1 / WHEEL_STEP;
      const at = shareOf(element, event);
      setView((view) => zoomTo(view, view.zoom * factor, at));
    };
    // React listens passively, where the browser's own zoom cannot be held back.
    element.addEventListener("wheel", zoom, { passive: false });
    return () => element.removeEventListener("wheel", zoom);
  }, [frame, setView]);
}

const KEEPS_ARROWS = "input, textarea, select, [contenteditable], [role=menu], .line";

/** Arrow keys move the photo wherever the focus is, except where they have work of their own. */
export function useArrowPan(
  frame: RefObject<HTMLElement | null>,
  view: StageView,
  setView: ChangeView,
  isListening = true,
) {
  useEffect(() => {
    if (!isListening) return;
    const press = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      if (event.target instanceof Element && event.target.closest(KEEPS_ARROWS)) return;
      // A stage behind an open dialog stays where it is.
      const modal = document.querySelector("dialog:modal");
      if (modal && !modal.contains(frame.current)) return;
      if (!panByKey(view, event.key)) return;
      event.preventDefault();
      setView((now) => panByKey(now, event.key) ?? now);
    };
    document.addEventListener("keydown", press);
    return () => document.removeEventListener("keydown", press);
  }, [frame, view, setView, isListening]);
}
