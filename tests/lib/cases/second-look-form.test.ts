import { describe, expect, it } from "vitest";
import { plannedMinutes } from "@/lib/cases/card-draft";
import {
  changeForm,
  chosenFix,
  formProblems,
  formToSend,
  sendWords,
  startForm,
  stepsOf,
  type SecondLookChange,
  type SecondLookForm,
  type SecondLookOffer,
} from "@/lib/cases/second-look-form";
import { confirmationSchema, releaseSchema } from "@/lib/cases/case.schema";

const step = (title: string, minutes: number, perPart = false, cautionKeys: string[] = []) => ({
  title,
  detail: "",
  minutes,
  perPart,
  cautionKeys,
});

/** Two classes that share the cause 12, and a cause with two fixes. Written by hand for these tests. */
const offer: SecondLookOffer = {
  quantity: 3,
  classes: [
    { slug: "underactivation", title: "Underactivation", causeIds: [11, 12] },
    { slug: "no-deposit", title: "No deposit", causeIds: [12] },
  ],
  causes: [
    { id: 11, title: "Activator past its day", stationKind: "activate", countHere: 2, fixIds: [21, 22] },
    { id: 12, title: "Strike voltage too low", stationKind: "strike", countHere: 0, fixIds: [] },
  ],
  fixes: [
    { id: 21, title: "Polish back", whenNot: "", steps: [step("Polish", 6, true, ["dust"]), step("Strike", 7)] },
    { id: 22, title: "Change the activator", whenNot: "", steps: [step("Empty", 20)] },
  ],
  cautions: { dust: { level: "caution", text: "Mask. Polishing dust." } },
};

const after = (...changes: SecondLookChange[]): SecondLookForm =>
  changes.reduce((form, change) => changeForm(form, change, offer), startForm("underactivation"));

describe("the second look's form", () => {
  it("asks for the cause before it can be sent, because the ledger rests on it", () => {
    expect(formProblems(startForm("underactivation"), offer)).toEqual({ causeId: "Choose the cause." });
  });

  it("asks for the class where the plater could not tell", () => {
    expect(formProblems(startForm(null), offer)).toEqual({ classSlug: "Choose the class." });
  });

  it("lays out the first fix of the cause, with minutes for all parts of the case", () => {
    const form = after({ type: "cause", id: 11 });
    // 6 minutes a part for 3 parts; the strike is once a batch.
    expect(stepsOf(form, offer).map((each) => each.minutes)).toEqual(["18", "7"]);
  });

  it("keeps what was typed into one fix while another is looked at", () => {
    const form = after(
      { type: "cause", id: 11 },
      { type: "step", key: "21-0", change: { title: "Polish the keyway" } },
      { type: "fix", id: 22 },
      { type: "fix", id: 21 },
    );
    expect(stepsOf(form, offer)[0]?.title).toBe("Polish the keyway");
  });

  it("keeps a step's cautions whatever is changed in its words", () => {
    const form = after(
      { type: "cause", id: 11 },
      { type: "step", key: "21-0", change: { title: "Wipe", minutes: "1" } },
    );
    expect(stepsOf(form, offer)[0]?.cautionKeys).toEqual(["dust"]);
  });

  it("moves, adds and takes off steps", () => {
    const form = after(
      { type: "cause", id: 11 },
      { type: "move", key: "21-0", by: 1 },
      { type: "add" },
      { type: "remove", key: "21-1" },
    );
    expect(stepsOf(form, offer).map((each) => each.title)).toEqual(["Polish", ""]);
  });

  it("leaves a step where it is at either end of the card", () => {
    const form = after(
      { type: "cause", id: 11 },
      { type: "move", key: "21-0", by: -1 },
      { type: "move", key: "21-1", by: 1 },
    );
    expect(stepsOf(form, offer).map((each) => each.title)).toEqual(["Polish", "Strike"]);
  });

  it("lets a cause go that the new class does not have, and keeps one that both have", () => {
    expect(after({ type: "cause", id: 11 }, { type: "class", slug: "no-deposit" }).causeId).toBeNull();
    expect(after({ type: "cause", id: 12 }, { type: "class", slug: "no-deposit" }).causeId).toBe(12);
  });

  it("wants a reason for scrap, and no card", () => {
    const form = after({ type: "cause", id: 11 }, { type: "disposition", disposition: "scrap" });
    expect(formProblems(form, offer)).toEqual({ why: "Say why it is not reworked, in a few words." });
    const reasoned = changeForm(form, { type: "why", why: "Cracked" }, offer);
    expect(formToSend("CT-2607-0001", reasoned, offer)).toMatchObject({
      disposition: "scrap",
      why: "Cracked",
      steps: "",
      fixId: "",
    });
  });

  it("refuses a step without a name and minutes that are no whole number", () => {
    const unnamed = after({ type: "cause", id: 11 }, { type: "step", key: "21-0", change: { title: " " } });
    expect(formProblems(unnamed, offer).steps).toBe("Give every step a name, or take it away.");
    const broken = after({ type: "cause", id: 11 }, { type: "step", key: "21-0", change: { minutes: "six" } });
    expect(formProblems(broken, offer).steps).toMatch(/whole numbers/);
  });

  it("asks for a step where the library has no fix for the cause", () => {
    const form = after({ type: "cause", id: 12 });
    expect(chosenFix(form, offer)).toBeNull();
    expect(formProblems(form, offer)).toEqual({ steps: "A rework card needs at least one step." });
  });

  it("sends what the confirmation's schema takes", () => {
    const sent = confirmationSchema.parse(formToSend("CT-2607-0001", after({ type: "cause", id: 11 }), offer));
    expect(sent).toMatchObject({ classSlug: "underactivation", causeId: 11, fixId: 21, cardTitle: "Polish back" });
    expect(sent.steps).toEqual([
      { title: "Polish", detail: "", plannedMinutes: 18, cautionKeys: ["dust"] },
      { title: "Strike", detail: "", plannedMinutes: 7, cautionKeys: [] },
    ]);
  });

  it("releases with no more than its reason, whatever else was filled in", () => {
    const form = after(
      { type: "cause", id: 11 },
      { type: "why", why: "Glare, not haze" },
      { type: "class", slug: "sound" },
    );
    expect(formProblems(form, offer)).toEqual({});
    expect(releaseSchema.parse(formToSend("CT-2607-0001", form, offer))).toEqual({
      ref: "CT-2607-0001",
      why: "Glare, not haze",
    });
    expect(sendWords(form)).toBe("Release as sound");
  });

  it("plans no step longer than a card can hold, however many parts there are", () => {
    // 500 parts at 6 minutes are 3000; a step holds at most a day (case-words, LIMITS.minutes).
    expect(plannedMinutes({ minutes: 6, perPart: true }, 500)).toBe(24 * 60);
  });
});
