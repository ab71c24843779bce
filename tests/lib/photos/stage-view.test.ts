import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { shotMissing } from "@/lib/photos/shot-words";
import { dragBy, MOST_ZOOM, panByKey, WHOLE_PHOTO, zoomTo, type StageView } from "@/lib/photos/stage-view";

const share = fc.double({ min: 0, max: 1, noNaN: true });
const anyView = fc
  .record({ zoom: fc.double({ min: 1, max: MOST_ZOOM, noNaN: true }), x: share, y: share })
  .map((view) => dragBy(view, 0, 0));

function expectInside(view: StageView) {
  const half = 0.5 / view.zoom;
  expect(view.x - half).toBeGreaterThanOrEqual(-1e-9);
  expect(view.x + half).toBeLessThanOrEqual(1 + 1e-9);
  expect(view.y - half).toBeGreaterThanOrEqual(-1e-9);
  expect(view.y + half).toBeLessThanOrEqual(1 + 1e-9);
}

describe("looking closer at a photo", () => {
  it("never shows what lies beside the photo, however it is moved", () => {
    fc.assert(
      fc.property(anyView, fc.double({ min: 0, max: 20, noNaN: true }), share, share, (view, zoom, x, y) => {
        expectInside(zoomTo(view, zoom, { x, y }));
        expectInside(dragBy(view, x - 0.5, y - 0.5));
      }),
    );
  });

  it("keeps the spot under the finger where it is", () => {
    // From the whole photo to 2×, pressing a quarter in from the left: that spot of the photo, x = 0.25, must stay at a
    // quarter of the frame, so the middle of the frame lies 0.25 of a frame, 0.125 of the photo, right of it.
    expect(zoomTo(WHOLE_PHOTO, 2, { x: 0.25, y: 0.5 })).toEqual({ zoom: 2, x: 0.375, y: 0.5 });
  });

  it("comes back to the whole photo in the middle", () => {
    fc.assert(
      fc.property(anyView, (view) => {
        expect(zoomTo(view, 1)).toEqual(WHOLE_PHOTO);
      }),
    );
  });

  it("leaves the arrow keys to the page while the whole photo is in sight", () => {
    expect(panByKey(WHOLE_PHOTO, "ArrowDown")).toBeNull();
    expect(panByKey({ zoom: 2, x: 0.5, y: 0.5 }, "Enter")).toBeNull();
  });

  it("moves the way the arrow points", () => {
    const view = { zoom: 4, x: 0.5, y: 0.5 };
    expect(panByKey(view, "ArrowRight")?.x).toBeGreaterThan(0.5);
    expect(panByKey(view, "ArrowUp")?.y).toBeLessThan(0.5);
  });
});

describe("a photo that is not there yet", () => {
  const shot = { number: 2, purpose: "suspect", round: 1, refusal: null, by: "Tobias Lindqvist" } as const;
  it("says whose phone it is still on", () => {
    expect(shotMissing({ ...shot, state: "awaited" })).toBe("Photo 2 is still on its way from Tobias's phone.");
  });
  it("says why it was not kept", () => {
    expect(shotMissing({ ...shot, state: "refused", refusal: "It is not a photo." })).toBe(
      "Photo 2 was not kept. It is not a photo.",
    );
  });
  it("says nothing once it is ready", () => {
    expect(shotMissing({ ...shot, state: "ready" })).toBeUndefined();
  });
});
