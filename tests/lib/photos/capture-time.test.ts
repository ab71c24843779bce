import { describe, expect, it } from "vitest";
import { captureTimeAt } from "@/lib/photos/capture-time";

describe("when a photo was taken", () => {
  it("is the camera's clock less its own offset", () => {
    // Offsets by their definition (ISO 8601): local = UTC + offset.
    const wallClockMs = Date.UTC(2026, 6, 14, 9, 12);
    expect(captureTimeAt({ wallClockMs, offset: "+02:00" }, "UTC")).toBe(Date.UTC(2026, 6, 14, 7, 12));
    expect(captureTimeAt({ wallClockMs, offset: "-05:30" }, "UTC")).toBe(Date.UTC(2026, 6, 14, 14, 42));
    expect(captureTimeAt({ wallClockMs, offset: "+00:00" }, "Europe/Stockholm")).toBe(wallClockMs);
  });

  it("is on the shop's own time where the camera names no offset, summer and winter", () => {
    // Stockholm: UTC+2 from the last Sunday of March to the last of October, else UTC+1 (EU directive 2000/84/EC).
    const at = (month: number) => ({ wallClockMs: Date.UTC(2026, month, 14, 9, 12) });
    expect(captureTimeAt(at(6), "Europe/Stockholm")).toBe(Date.UTC(2026, 6, 14, 7, 12));
    expect(captureTimeAt(at(0), "Europe/Stockholm")).toBe(Date.UTC(2026, 0, 14, 8, 12));
  });

  it("is right in the hours beside a clock change", () => {
    // New York: on 8 March 2026 at 2:00 the clock goes on to 3:00 (US Energy Policy Act of 2005), from UTC-5 to UTC-4.
    const zone = "America/New_York";
    expect(captureTimeAt({ wallClockMs: Date.UTC(2026, 2, 8, 1, 30) }, zone)).toBe(Date.UTC(2026, 2, 8, 6, 30));
    expect(captureTimeAt({ wallClockMs: Date.UTC(2026, 2, 8, 3, 30) }, zone)).toBe(Date.UTC(2026, 2, 8, 7, 30));
  });

  it("is not known when the camera's clock was never set", () => {
    expect(captureTimeAt({ wallClockMs: Date.UTC(1970, 0, 1) }, "UTC")).toBeNull();
    expect(captureTimeAt({ wallClockMs: NaN }, "UTC")).toBeNull();
  });

  it("takes an offset that is none as none", () => {
    const wallClockMs = Date.UTC(2026, 0, 1, 12);
    for (const offset of ["", "   :  ", "Z", "+2"])
      expect(captureTimeAt({ wallClockMs, offset }, "UTC")).toBe(wallClockMs);
  });

  it("cannot be told in a zone that does not exist", () => {
    expect(() => captureTimeAt({ wallClockMs: Date.UTC(2026, 0, 1) }, "Europe/Atlantis")).toThrow(RangeError);
  });
});
