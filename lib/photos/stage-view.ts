/** What part of a photo is looked at: how large, and which point of the frame stands in the middle (0 to 1 each way). */
export interface StageView {
  zoom: number;
  x: number;
  y: number;
}

export const WHOLE_PHOTO: StageView = { zoom: 1, x: 0.5, y: 0.5 };
export const MOST_ZOOM = 8;
/** One press of an arrow key moves by this share of what is seen. */
const PAN_SHARE = 0.2;

const between = (low: number, value: number, high: number) => Math.min(high, Math.max(low, value));

/** Keeps the view inside the photo: no edge is ever pulled into the frame. */
function inside({ zoom, x, y }: StageView): StageView {
  const held = between(1, zoom, MOST_ZOOM);
  const margin = 0.5 / held;
  return { zoom: held, x: between(margin, x, 1 - margin), y: between(margin, y, 1 - margin) };
}

/**
 * Zooms so that the point under the finger or pointer stays where it is.
 * @param at that point, as shares of the frame's width and height (0 to 1); the middle without it
 */
export function zoomTo(view: StageView, zoom: number, at: { x: number; y: number } = { x: 0.5, y: 0.5 }): StageView {
  const held = between(1, zoom, MOST_ZOOM);
  // The point of the photo that lies under the pointer before and after.
  const photoX = view.x + (at.x - 0.5) / view.zoom;
  const photoY = view.y + (at.y - 0.5) / view.zoom;
  return inside({ zoom: held, x: photoX - (at.x - 0.5) / held, y: photoY - (at.y - 0.5) / held });
}

/** Moves by a drag, given as shares of the frame. Dragging right shows what lies further left. */
export function dragBy(view: StageView, dx: number, dy: number): StageView {
  return inside({ zoom: view.zoom, x: view.x - dx / view.zoom, y: view.y - dy / view.zoom });
}

const ARROWS: Record<string, { x: number; y: number }> = {
  ArrowLeft: { x: -PAN_SHARE, y: 0 },
  ArrowRight: { x: PAN_SHARE, y: 0 },
  ArrowUp: { x: 0, y: -PAN_SHARE },
  ArrowDown: { x: 0, y: PAN_SHARE },
};

/** Moves by an arrow key. Null when the key is none, or when the whole photo is in sight: then the page scrolls. */
export function panByKey(view: StageView, key: string): StageView | null {
  const arrow = ARROWS[key];
  if (!arrow || view.zoom <= 1) return null;
  return inside({ zoom: view.zoom, x: view.x + arrow.x / view.zoom, y: view.y + arrow.y / view.zoom });
}
