import { describe, expect, it } from "vitest";
import type { Sureness } from "@/lib/cases/case-words";
import {
  calibrationOf,
  confusionTable,
  firstAnswers,
  kappaOf,
  notchWords,
  scoreOf,
  type PracticeAnswer,
} from "@/lib/practice/progress";
import { readTable } from "@/tests/fixtures/reference/read-table";

let made = 0;
const answer = (called: string | null, confirmed: string, sure: Sureness = 2): PracticeAnswer => {
  made += 1;
  return { photoId: `p${made}`, called, confirmed, sure };
};
const times = (count: number, called: string | null, confirmed: string, sure: Sureness = 2) =>
  Array.from({ length: count }, () => answer(called, confirmed, sure));

/** A published table of two raters played as calls: rows are what was confirmed, columns what was called. */
function played(table: string): PracticeAnswer[] {
  const rows = table.split(";").map((row) => row.trim().split(/\s+/).map(Number));
  return rows.flatMap((row, was) => row.flatMap((count, called) => times(count, `class-${called}`, `class-${was}`)));
}

describe("kappa of practice, by published tables (tests/fixtures/reference/kappa_examples.csv)", () => {
  const tables = readTable("kappa_examples.csv").filter((row) => /^K[123]$/.test(row.id ?? ""));

  it.each(tables)("is as published for $id: $source", (row) => {
    const kappa = kappaOf(played(row.table_rows_rater1_cols_rater2 ?? ""));
    if (!kappa.defined) throw new Error(kappa.why);
    expect(kappa.cases).toBe(Number(row.n));
    expect(kappa.kappa).toBeCloseTo(Number(row.kappa), 3);
    expect(kappa.standardError).toBeCloseTo(Number(row.se), 3);
    expect(kappa.low).toBeCloseTo(Number(row.ci95_low), 3);
    expect(kappa.high).toBeCloseTo(Number(row.ci95_high), 3);
  });

  it("has its word by Landis and Koch (Biometrics 33, 1977, 159): 0.40 is fair", () => {
    const kappa = kappaOf(played("20 5;10 15"));
    expect(kappa.defined && kappa.word).toBe("fair");
  });

  it("says nothing where everything was one class (K5), and leaves can't tell out", () => {
    expect(kappaOf(times(4, "sound", "sound"))).toEqual({ defined: false, cases: 4, why: "one class only" });
    const kappa = kappaOf([...played("20 5;10 15"), ...times(30, null, "class-0")]);
    expect(kappa.cases).toBe(50);
  });
});

describe("the score", () => {
  // Newcombe, Statistics in Medicine 17 (1998) 857: 81 of 263 is 0.2553 to 0.3662; R's binom package: 18 of 20 is 0.69897 to 0.97213.
  it.each([
    [81, 263, 0.2553, 0.3662],
    [18, 20, 0.699, 0.9721],
  ])("of %d of %d has the published interval", (right, calls, low, high) => {
    const score = scoreOf([...times(right, "peeling", "peeling"), ...times(calls - right, "sound", "peeling")]);
    expect(score).toMatchObject({ right, calls, cantTell: 0 });
    expect(score.interval.low).toBeCloseTo(low, 4);
    expect(score.interval.high).toBeCloseTo(high, 4);
  });

  it("counts can't tell neither way", () => {
    expect(scoreOf([...times(3, "peeling", "peeling"), ...times(2, null, "peeling")])).toMatchObject({
      right: 3,
      calls: 3,
      cantTell: 2,
    });
  });

  it("rests on the first call on each photo, since one that comes back is remembered", () => {
    const first = answer("sound", "peeling");
    const again = { ...first, called: "peeling" };
    expect(firstAnswers([first, again])).toEqual([first]);
  });
});

describe("what is called what", () => {
  it("is a table with what was confirmed down and what was called across, in the shop's order", () => {
    const answers = [
      ...times(2, "peeling", "dewetting"),
      ...times(1, "dewetting", "dewetting"),
      ...times(1, null, "peeling"),
    ];
    expect(confusionTable(answers, ["dewetting", "burning", "peeling"])).toEqual({
      classes: ["dewetting", "peeling"],
      table: [
        [1, 2],
        [0, 0],
      ],
      cantTell: [0, 1],
    });
  });

  it("keeps a class that has left the library", () => {
    expect(confusionTable(times(1, "own-old", "peeling"), ["peeling"]).classes).toEqual(["peeling", "own-old"]);
  });
});

describe("how sure against how right", () => {
  // scikit-learn, docstring of brier_score_loss: truth 0 1 1 0, chances .1 .9 .8 .3, score 0.0375. With three notches at
  // .1, .8 and .9 the first three make (0.01 + 0.01 + 0.04) / 3 = 0.02, by hand.
  it("scores the promised shares as Brier did", () => {
    const answers = [answer("sound", "peeling", 1), answer("peeling", "peeling", 3), answer("peeling", "peeling", 2)];
    const { brier } = calibrationOf(answers, { 1: 0.1, 2: 0.8, 3: 0.9 });
    expect(brier.enough && brier.score).toBeCloseTo(0.02, 12);
    const more = calibrationOf(
      [answer("sound", "peeling", 1), answer("peeling", "peeling", 3), answer("sound", "peeling", 2)],
      { 1: 0.1, 2: 0.3, 3: 0.9 },
    );
    // .1 no, .9 yes, .3 no of the same docstring: (0.01 + 0.01 + 0.09) / 3.
    expect(more.brier.enough && more.brier.score).toBeCloseTo(0.11 / 3, 12);
  });

  // By hand: 10 guesses with 4 right, 10 certain with 5 right, promised 0.35 and 0.95:
  // (4 × 0.65² + 6 × 0.35² + 5 × 0.05² + 5 × 0.95²) / 20 = (1.69 + 0.735 + 0.0125 + 4.5125) / 20 = 0.3475.
  it("shows for each notch what it promises and what it kept", () => {
    const { notches, brier } = calibrationOf([
      ...times(4, "peeling", "peeling", 1),
      ...times(6, "sound", "peeling", 1),
      ...times(5, "peeling", "peeling", 3),
      ...times(5, "sound", "peeling", 3),
      answer(null, "peeling", 1),
    ]);
    expect(notches.map(({ sure, calls, right }) => [sure, calls, right])).toEqual([
      [1, 10, 4],
      [2, 0, 0],
      [3, 10, 5],
    ]);
    expect(brier.enough && brier.score).toBeCloseTo(0.3475, 10);
    expect(notches.map(notchWords)).toEqual(["Sure as right", "Not enough yet: 0 of 8", "Surer than right"]);
  });

  it("has no score without calls", () => {
    expect(calibrationOf([]).brier).toEqual({ enough: false, have: 0, need: 1 });
  });
});
