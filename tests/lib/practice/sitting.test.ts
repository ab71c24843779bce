import { describe, expect, it } from "vitest";
import { drillStanding, standingWords } from "@/lib/practice/drill";
import { comesBackWords, comingBack, waitingWords } from "@/lib/practice/practice-words";
import { answerInput, drillInput } from "@/lib/practice/practice.schema";
import { sittingOf, sittingWords } from "@/lib/practice/sitting";

const called = (count: number, missed: readonly number[] = []) =>
  Array.from({ length: count }, (_, index) => ({ questionId: `q${index}`, isRight: !missed.includes(index) }));

describe("a sitting", () => {
  it("says which photo of ten it is and how the others went", () => {
    const sitting = sittingOf({ answers: called(5, [2]), questionId: "open", size: 10, left: 40 });
    expect(sitting).toMatchObject({ place: 6, right: 4, missed: 1 });
    expect(sitting.photos).toHaveLength(10);
    expect(sitting.photos.map((photo) => photo.isNow).indexOf(true)).toBe(5);
    expect(sittingWords(sitting)).toBe("4 called right, 1 missed");
  });

  it("stays on the photo once it is called, and begins anew after ten", () => {
    expect(sittingOf({ answers: called(6), questionId: "q5", size: 10, left: 40 }).place).toBe(6);
    expect(sittingOf({ answers: called(10), questionId: "open", size: 10, left: 40 })).toMatchObject({
      place: 1,
      right: 0,
    });
  });

  it("is as long as there are photos for it", () => {
    expect(sittingOf({ answers: called(2), questionId: "open", size: 10, left: 0 }).photos).toHaveLength(3);
  });
});

describe("a drill", () => {
  it("tells how far a person is, and is done where the shop has no more photos of it", () => {
    expect(standingWords(drillStanding({ called: 4, right: 3 }, 10, 20))).toBe("4 of 10, 3 right");
    expect(standingWords(drillStanding({ called: 0, right: 0 }, 10, 20))).toBe("Not begun, 10 to call");
    expect(standingWords(drillStanding({ called: 10, right: 7 }, 10, 20))).toBe("Done: 7 of 10 right");
    expect(drillStanding({ called: 6, right: 6 }, 10, 0)).toMatchObject({ photos: 6, isDone: true });
  });

  it("needs a name, people, and 1 to 40 photos", () => {
    const words = (input: unknown) => drillInput.safeParse(input).error?.issues.map((issue) => issue.path.join("."));
    expect(words({ title: " ", photoCount: "0", memberIds: [] })).toEqual(["title", "photoCount", "memberIds"]);
    expect(words({ title: "x", photoCount: "41", memberIds: ["1"], dueDay: "soon" })).toEqual(["photoCount", "dueDay"]);
    expect(words({ title: "x", photoCount: "10", memberIds: "1", classSlugs: "peeling", dueDay: "" })).toBeUndefined();
  });
});

describe("a call on a photo", () => {
  const id = "a".repeat(22);

  it("needs a class and how sure, but can't tell needs no sureness", () => {
    expect(answerInput.safeParse({ id, calledClass: "peeling", sure: "2" }).data).toMatchObject({ sure: 2 });
    expect(answerInput.safeParse({ id, calledClass: "cant-tell" }).data).toEqual({ id, calledClass: null, sure: 1 });
    expect(answerInput.safeParse({ id, calledClass: "cant-tell", sure: "3" }).data).toMatchObject({ sure: 1 });
    const paths = (input: unknown) => answerInput.safeParse(input).error?.issues.map((issue) => issue.path.join("."));
    expect(paths({ id, calledClass: "peeling" })).toEqual(["sure"]);
    expect(paths({ id, sure: "2" })).toEqual(["calledClass"]);
    expect(paths({ id: "7", calledClass: "peeling", sure: "2" })).toEqual(["id"]);
    expect(paths({ id, calledClass: "peeling", sure: "4" })).toEqual(["sure"]);
  });
});

describe("the words of what comes back", () => {
  const now = Date.UTC(2026, 11, 1, 22);
  const day = 86_400_000;

  it("count by the shop's calendar, not by hours", () => {
    expect(comesBackWords(now + 3 * 3_600_000, now, "UTC")).toBe("tomorrow");
    // In Auckland (UTC+13 in December) both moments lie on 2 December.
    expect(comesBackWords(now + 3 * 3_600_000, now, "Pacific/Auckland")).toBe("today");
    expect(comesBackWords(now + 5 * day, now, "UTC")).toBe("in 5 days");
    expect(comesBackWords(Date.UTC(2027, 2, 3), now, "UTC")).toBe("on 3 Mar 2027");
  });

  it("put each photo into one stretch of days, what is overdue into today", () => {
    const rows = comingBack([now - 9 * day, now, now + day, now + 6 * day, now + 20 * day, now + 90 * day], now, "UTC");
    expect(rows.map((row) => row.photos)).toEqual([2, 1, 1, 1, 1]);
  });

  it("open the page with what waits", () => {
    expect(waitingWords(6, 3)).toBe("Six photos are due");
    expect(waitingWords(1, 0)).toBe("One photo is due");
    expect(waitingWords(0, 10)).toBe("Ten new photos to call");
    expect(waitingWords(0, 0)).toBe("Nothing comes back today");
  });
});
