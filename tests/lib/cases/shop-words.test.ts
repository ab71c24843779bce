import { describe, expect, it } from "vitest";
import { readCursor, writeCursor } from "@/lib/cases/card-cursor";
import {
  callWords,
  counted,
  countWords,
  firstCallWords,
  metalInside,
  metalWords,
  partsOf,
} from "@/lib/cases/part-words";
import { dayAndTime, timeOfDay } from "@/lib/cases/shop-clock";
import { writeStep } from "@/lib/cases/written-step";

/** Stockholm is two hours ahead of UTC in July (IANA tz: CEST). */
const MORNING = Date.UTC(2026, 6, 14, 7, 12);

// The words are those of design/mock/snap.html and rework.html.
describe("words on a tag", () => {
  it("says the shop's time, not the server's", () => {
    expect(timeOfDay(MORNING, "Europe/Stockholm")).toBe("09:12");
    expect(dayAndTime(MORNING, "Europe/Stockholm")).toBe("14 Jul, 09:12");
  });

  it("puts a question mark behind a call and none behind a confirmed class", () => {
    expect(callWords("Underactivation", false)).toBe("Underactivation?");
    expect(callWords("Underactivation", true)).toBe("Underactivation");
    expect(callWords(null, false)).toBe("Can't tell yet");
  });

  it("says how sure the caller was, and nothing of it for one who can't tell", () => {
    expect(firstCallWords("burning", 2)).toBe("First call, fairly sure");
    expect(firstCallWords(null, 1)).toBe("First call: can't tell");
  });

  it("names metal and parts as the rack tag does", () => {
    expect(metalWords("brass", "C360")).toBe("Brass C360");
    expect(metalWords("steel", null)).toBe("Steel");
    expect(metalInside("brass", "C360")).toBe("brass C360");
    expect(partsOf(3, 48)).toBe("3 of 48");
    expect(partsOf(3, null)).toBe("3");
    expect(counted(1, "part")).toBe("1 part");
    expect(countWords(5)).toBe("five");
    expect(countWords(11)).toBe("11");
  });

  it("shows a ticked step with who, when and how long, an open one without", () => {
    const step = { id: 4, title: "Rinse", detail: "", plannedMinutes: 3, cautions: [] };
    const open = writeStep({ ...step, tickedAt: null, tickedBy: null, spentMinutes: null }, "Europe/Stockholm");
    expect(open.ticked).toBeNull();
    const ticked = writeStep(
      { ...step, tickedAt: MORNING, tickedBy: "Tobias Lindqvist", spentMinutes: 4 },
      "Europe/Stockholm",
    );
    expect(ticked.ticked).toEqual({ by: "Tobias L", at: "14 Jul, 09:12", spentMinutes: 4 });
  });

  it("reads back the place where a page of cards ended, and ignores what it did not write", () => {
    expect(readCursor(writeCursor({ madeAt: 1_783_000_000_000, caseId: 42 }))).toEqual({
      madeAt: 1_783_000_000_000,
      caseId: 42,
    });
    for (const text of [undefined, "", "1", "a-b", "1-2-3", "9".repeat(20) + "-1"])
      expect(readCursor(text)).toBeUndefined();
  });
});
