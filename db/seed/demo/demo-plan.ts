import type { Closing, Outcome, Sureness, Symptom } from "@/lib/cases/case-words";
import type { Random } from "@/db/seed/photos/random";
import { DEMO_FAULTS, DEMO_JOBS, type DemoFault, type DemoJob } from "./demo-jobs";
import { solutionAt, type DemoSolution } from "./demo-line";

const MINUTE_MS = 60_000;
const DAY_MS = 86_400_000;

/** How far a demo case has come. */
export type DemoEnd =
  | { state: "held" }
  | { state: "confirmed" }
  | { state: "in-rework"; ticked: number }
  | { state: "closed"; closing: Closing };

/** One invented case, before it is played through the product's own changes. */
export interface DemoCase {
  job: DemoJob;
  openedAt: number;
  /** What it really is. "sound": a false alarm. */
  fault: DemoFault["slug"] | "sound";
  called: string | null;
  sure: Sureness;
  byTrainee: boolean;
  plater: 0 | 1;
  quantity: number;
  symptoms: Symptom[];
  note: string;
  stageFound: "at-strike" | "after-final-plate" | "returned";
  /** Outcome of each round's re-strike, in order. */
  outcomes: Outcome[];
  end: DemoEnd;
  seed: number;
}

/** Picks one of a list by weight. */
export function pick<Item extends { weight: number }>(random: Random, items: readonly Item[]): Item {
  const total = items.reduce((sum, item) => sum + item.weight, 0);
  let left = random() * total;
  for (const item of items) {
    left -= item.weight;
    if (left < 0) return item;
  }
  const last = items.at(-1);
  if (!last) throw new RangeError("items: the list is empty");
  return last;
}

const oneOf = <Item>(random: Random, items: readonly Item[]): Item => {
  const item = items[Math.floor(random() * items.length)];
  if (item === undefined) throw new RangeError("items: the list is empty");
  return item;
};

/** A past weekday, in working hours, at most `days` ago. */
function workingMoment(random: Random, now: number, days: number): number {
  for (;;) {
    const day = Math.floor((now - random() * days * DAY_MS) / DAY_MS) * DAY_MS;
    const at = day + (7 + random() * 8) * 60 * MINUTE_MS;
    const weekday = new Date(day).getUTCDay();
    if (weekday !== 0 && weekday !== 6 && at < now - DAY_MS) return Math.round(at);
  }
}

/** A case that is over. Underactivation comes with an activator past its window, as it does in life. */
function closedCase(random: Random, now: number, seed: number, line: readonly DemoSolution[]): DemoCase {
  const openedAt = workingMoment(random, now, 118);
  const job = pick(random, DEMO_JOBS);
  const fault = faultAt(random, job, openedAt, line);
  const facts = caseFacts(random, job, fault, seed);
  const round2 = random() < 0.18;
  const closing: Closing = random() < 0.05 ? "scrap" : random() < 0.02 ? "concession" : "sound";
  const isAlarm = random() < 0.06;
  return {
    ...facts,
    openedAt,
    ...(isAlarm
      ? { fault: "sound" as const, end: { state: "closed", closing: "released" } as const, outcomes: [] }
      : { outcomes: round2 ? ["same-fault", "sound"] : ["sound"], end: { state: "closed", closing } as const }),
  };
}

function faultAt(random: Random, job: DemoJob, at: number, line: readonly DemoSolution[]): DemoFault {
  const activator = solutionAt(line, "activate", job.method, at);
  const share = activator ? (at - activator.fromAt) / DAY_MS / activator.windowDays : 0;
  return pick(
    random,
    DEMO_FAULTS.map((fault) => (fault.slug === "underactivation" && share > 1 ? { ...fault, weight: 80 } : fault)),
  );
}

function caseFacts(random: Random, job: DemoJob, fault: DemoFault, seed: number) {
  const byTrainee = random() < 0.12;
  const isRight = random() < (byTrainee ? 0.55 : 0.8);
  const called = isRight ? fault.slug : random() < 0.15 ? null : pick(random, DEMO_FAULTS).slug;
  const stage = random();
  return {
    job,
    fault: fault.slug,
    called,
    sure: (called === null ? 1 : 1 + Math.floor(random() * 3)) as Sureness,
    byTrainee,
    plater: (random() < 0.5 ? 0 : 1) as 0 | 1,
    quantity: 1 + Math.floor(random() * random() * 14),
    symptoms: fault.symptoms.filter(() => random() < 0.85),
    note: random() < 0.7 ? oneOf(random, fault.notes) : "",
    stageFound: (stage < 0.9 ? "at-strike" : stage < 0.98 ? "after-final-plate" : "returned") as DemoCase["stageFound"],
    seed,
  };
}

/** What is open on the day the demo is made: minutes ago, class, how far. */
const OPEN: { minutesAgo: number; fault: DemoFault["slug"]; job: number; quantity: number; end: DemoEnd; outcomes: Outcome[] }[] = [
  { minutesAgo: 38, fault: "underactivation", job: 0, quantity: 3, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 125, fault: "peeling", job: 3, quantity: 1, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 12, fault: "overactivation", job: 2, quantity: 3, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 64, fault: "water-spots", job: 4, quantity: 2, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 200, fault: "dewetting", job: 5, quantity: 14, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 260, fault: "underactivation", job: 1, quantity: 8, end: { state: "held" }, outcomes: ["same-fault"] },
  { minutesAgo: 1500, fault: "oxidation", job: 6, quantity: 4, end: { state: "held" }, outcomes: [] },
  { minutesAgo: 300, fault: "underactivation", job: 1, quantity: 6, end: { state: "confirmed" }, outcomes: [] },
  { minutesAgo: 1440, fault: "dewetting", job: 0, quantity: 5, end: { state: "confirmed" }, outcomes: [] },
  { minutesAgo: 330, fault: "water-spots", job: 2, quantity: 4, end: { state: "in-rework", ticked: 2 }, outcomes: [] },
  { minutesAgo: 410, fault: "overactivation", job: 5, quantity: 9, end: { state: "in-rework", ticked: 1 }, outcomes: [] },
]; // prettier-ignore

/** The demo shop's cases, oldest first: `closed` that are over and those that are open today. */
export function planCases(random: Random, now: number, closed: number, line: readonly DemoSolution[]): DemoCase[] {
  const over = Array.from({ length: closed }, (_, index) => closedCase(random, now, 1000 + index, line));
  const open = OPEN.map((each, index): DemoCase => {
    const job = DEMO_JOBS[each.job] ?? pick(random, DEMO_JOBS);
    const fault = DEMO_FAULTS.find((one) => one.slug === each.fault) ?? pick(random, DEMO_FAULTS);
    const facts = caseFacts(random, job, fault, 5000 + index);
    return {
      ...facts,
      called: fault.slug,
      byTrainee: false,
      stageFound: "at-strike",
      quantity: each.quantity,
      openedAt: now - each.minutesAgo * MINUTE_MS,
      end: each.end,
      outcomes: each.outcomes,
    };
  });
  return [...over, ...open].sort((a, b) => a.openedAt - b.openedAt);
}
