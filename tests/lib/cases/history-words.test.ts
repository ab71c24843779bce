import { describe, expect, it } from "vitest";
import { caseTimeline } from "@/lib/cases/case-timeline";
import { CASE_EVENTS } from "@/lib/cases/case-state";
import { historyWords, type HistoryContext } from "@/lib/cases/history-words";
import { traceWords } from "@/lib/cases/trace-words";

// Titles written by hand for these tests; the sentences are those of the design's case page (look.md, mock of the case page).
const context: HistoryContext = {
  classTitle: (slug) => (slug === "underactivation" ? "Underactivation" : slug),
  causeTitle: (id) => (id === 4 ? "Activator past its day" : null),
};
const row = (event: (typeof CASE_EVENTS)[number], detail: Record<string, unknown> = {}, why = "") => ({
  event,
  by: "Ines Varga",
  why,
  detail,
});

describe("a case's history in words", () => {
  it("tells the first call with the row that opened the case", () => {
    const firstCall = { classTitle: "Water spots", sure: 1 as const };
    expect(historyWords(row("opened"), { ...context, firstCall })).toMatchObject({
      title: "Held",
      who: "by Ines Varga",
      lines: ["First call: water spots, a guess"],
    });
  });

  it("says it when the plater could not tell", () => {
    const firstCall = { classTitle: null, sure: 1 as const };
    expect(historyWords(row("opened"), { ...context, firstCall }).lines).toEqual(["First call: can't tell"]);
  });

  it("tells class, cause and disposition of a confirmation, and the word that came with it", () => {
    const detail = { classSlug: "underactivation", causeId: 4, disposition: "rework" };
    expect(historyWords(row("confirmed", detail, "Use fresh A-12."), context).lines).toEqual([
      "Underactivation. Activator past its day. Rework.",
      "Use fresh A-12.",
    ]);
  });

  it("tells how far the card came and how long it took", () => {
    const card = { ticked: 4, all: 4, minutes: 41, quantity: 12 };
    expect(historyWords(row("rework-started"), { ...context, card })).toMatchObject({
      title: "In rework",
      who: ", Ines Varga",
      lines: ["4 of 4 steps, 41 min for 12 parts"],
    });
  });

  it("names what the re-strike showed", () => {
    expect(historyWords(row("re-strike-failed", { outcome: "same-fault" }), context)).toMatchObject({
      title: "Same fault",
      tone: "bad",
    });
    expect(historyWords(row("re-strike-sound"), context)).toMatchObject({ title: "Sound", tone: "good" });
  });

  it("tells each corrected fact with what stood before, and no other", () => {
    const detail = {
      before: { quantity: 3, baseMetal: "steel", stageFound: "at-strike", note: "" },
      after: { quantity: 5, baseMetal: "brass", stageFound: "at-strike", note: "" },
    };
    expect(historyWords(row("amended", detail), context).lines).toEqual([
      "Parts: 5, was 3",
      "Base metal: brass, was steel",
    ]);
  });

  it("never leaves out the reason that a person gave", () => {
    for (const event of CASE_EVENTS) {
      expect(historyWords(row(event, {}, "Because of the crack"), context).lines.at(-1)).toBe("Because of the crack");
    }
  });

  it("still tells a row whose detail is not what it should be", () => {
    expect(historyWords(row("disposed", { disposition: 7 }), context).title).toBe("Disposed");
    expect(historyWords(row("amended", { before: null, after: "x" }), context).lines).toEqual([]);
  });
});

describe("a case's timeline", () => {
  const facts = {
    classes: [{ slug: "underactivation", title: "Underactivation" }],
    causes: [],
    quantity: 2,
    cards: [
      {
        round: 1,
        steps: [
          { tickedAt: 60, spentMinutes: 9 },
          { tickedAt: null, spentMinutes: null },
        ],
      },
    ],
    events: [
      { id: 1, round: 1, event: "opened" as const, by: "Tobias Lindqvist", why: "", detail: {}, at: 10 },
      { id: 2, round: 1, event: "confirmed" as const, by: "Ines Varga", why: "", detail: {}, at: 30 },
      { id: 3, round: 1, event: "rework-started" as const, by: "Marisol Okafor", why: "", detail: {}, at: 40 },
      { id: 4, round: 2, event: "taken-back" as const, by: "Ines Varga", why: "Wrong part", detail: {}, at: 50 },
    ],
    calls: [
      {
        id: 1,
        round: 1,
        kind: "first" as const,
        by: "Tobias Lindqvist",
        asTrainee: false,
        classTitle: "Water spots",
        sure: 1 as const,
        at: 10,
      },
      {
        id: 2,
        round: 1,
        kind: "further" as const,
        by: "Dara Moss",
        asTrainee: true,
        classTitle: "Underactivation",
        sure: 2 as const,
        at: 20,
      },
      {
        id: 3,
        round: 1,
        kind: "second-look" as const,
        by: "Ines Varga",
        asTrainee: false,
        classTitle: "Underactivation",
        sure: 3 as const,
        at: 30,
      },
    ],
  };

  it("puts further calls among the changes of state, and splits by round", () => {
    const rounds = caseTimeline(facts);
    expect(rounds.map((round) => [round.round, round.entries.map((entry) => entry.title)])).toEqual([
      [1, ["Held", "Called", "Confirmed", "In rework"]],
      [2, ["Taken back"]],
    ]);
  });

  it("marks a trainee's call as one", () => {
    expect(caseTimeline(facts)[0]?.entries[1]).toMatchObject({
      who: "by Dara Moss, trainee",
      lines: ["A further call: underactivation, fairly sure"],
    });
  });

  it("counts only the minutes of ticked steps", () => {
    expect(caseTimeline(facts)[0]?.entries[3]?.lines).toEqual(["1 of 2 steps, 9 min for 2 parts"]);
  });
});

describe("where a fault was seen and where it began", () => {
  it("says it as a fact once the cause is confirmed, and as a guess before", () => {
    expect(traceWords({ found: "strike", traced: "activate", isConfirmed: true, isReleased: false })).toBe(
      "Seen at the strike. It began in the activator.",
    );
    expect(traceWords({ found: "strike", traced: "activate", isConfirmed: false, isReleased: false })).toBe(
      "Seen at the strike. It may have begun in the activator.",
    );
  });

  it("blames no station for a part that was sound", () => {
    expect(traceWords({ found: "strike", traced: "activate", isConfirmed: false, isReleased: true })).toBe(
      "Seen at the strike. The part was sound.",
    );
  });
});
