import { describe, expect, it } from "vitest";
import { dayWords, momentWords, waitWords } from "@/lib/cases/moment-words";
import { readQueueCursor, writeQueueCursor } from "@/lib/cases/queue-cursor";
import { tagStanding } from "@/lib/cases/tag-standing";

const MINUTE = 60_000;

describe("how long a part waits", () => {
  // The first two are the words of the design's queue (mock of the second look).
  it.each([
    [38 * MINUTE, "38 min"],
    [125 * MINUTE, "2 h 05"],
    [0, "0 min"],
    [-5, "0 min"],
    [26 * 60 * MINUTE, "1 day 2 h"],
    [5 * 24 * 60 * MINUTE + MINUTE, "5 days"],
  ])("%i ms is %s", (waited, words) => expect(waitWords(waited)).toBe(words));
});

describe("a moment on the shop's clock", () => {
  const at = Date.UTC(2026, 5, 22, 8, 14);
  it("leaves the year out within it, and says it after", () => {
    expect(momentWords(at, "UTC", Date.UTC(2026, 8, 1))).toBe("22 Jun 08:14");
    expect(momentWords(at, "UTC", Date.UTC(2027, 0, 2))).toBe("22 Jun 2026 08:14");
  });
  it("is the shop's time and not the server's", () => {
    // Stockholm is two hours ahead of UTC in June (IANA time zone database).
    expect(momentWords(at, "Europe/Stockholm", at)).toBe("22 Jun 10:14");
    expect(dayWords(at, "Europe/Stockholm")).toBe("22 Jun 2026");
  });
});

describe("what a tag says", () => {
  const held = { state: "held", closing: null, round: 1, heldAt: 0 } as const;
  it.each([
    [held, "held", "Held 38 min"],
    [{ ...held, round: 2 }, "held", "Round 2, 38 min"],
    [{ ...held, state: "in-rework", card: { steps: 4, ticked: 2 } }, "in-rework", "Step 3 of 4"],
    [{ ...held, state: "closed", closing: "sound", round: 2 }, "closed-sound", "Closed, sound in round 2"],
    [{ ...held, state: "closed", closing: "released" }, "released", "Released, it was sound"],
  ] as const)("%o", (standing, state, words) => {
    expect(tagStanding(standing, 38 * MINUTE)).toEqual({ state, words });
  });
});

describe("the queue's cursor", () => {
  it("comes back as it went out, and a made-up one is the first page", () => {
    const place = { atRiskCents: 41200, heldAt: 1_780_000_000_000, id: 7 };
    expect(readQueueCursor(writeQueueCursor(place))).toEqual(place);
    for (const bad of [undefined, "", "1-2", "1-2-x", "-1-2-3", "1-2-3; drop"]) expect(readQueueCursor(bad)).toBeNull();
  });
});
