import { and, asc, eq } from "drizzle-orm";
import { addCall } from "@/db/changes/add-call";
import { confirmCase, releaseCase } from "@/db/changes/confirm-case";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import { disposeCase } from "@/db/changes/close-case";
import { openCase } from "@/db/changes/open-case";
import type { Handle } from "@/db/open";
import { requireCase } from "@/db/queries/cases";
import {
  libraryCauseFixes,
  libraryCauses,
  libraryClassCauses,
  libraryFixes,
  reworkCards,
  reworkSteps,
  runs,
} from "@/db/schema";
import type { Random } from "@/db/seed/photos/random";
import type { CardStepInput } from "@/lib/cases/case.schema";
import { pick, type DemoCase } from "./demo-plan";
import { solutionAt, type DemoSolution } from "./demo-line";

const MINUTE_MS = 60_000;

export interface DemoCrew {
  platers: [number, number];
  trainee: number;
  senior: number;
}

export interface DemoStage {
  shopId: number;
  timeZone: string;
  now: number;
  crew: DemoCrew;
  jobIds: Map<string, number>;
  stationIds: Map<string, number>;
  solutions: DemoSolution[];
  random: Random;
  /** A number that looks like the phone's own, from the seeded random. */
  uuid: () => string;
}

/** The photos that a played case waits for. */
export interface DemoShots {
  plan: DemoCase;
  caseId: number;
  suspect: string[];
  restrike: { id: string; isSound: boolean; round: number }[];
  memberId: number;
}

/**
 * Plays one invented case through the product's own changes, so that demo rows obey every rule that real ones do:
 * snap, calls, second look, card, re-strike. Only the clock is moved.
 */
export function playCase(tx: Handle, stage: DemoStage, plan: DemoCase, runNumber: number): DemoShots {
  const { shopId, crew, random } = stage;
  const memberId = plan.byTrainee ? crew.trainee : crew.platers[plan.plater];
  const snapper = { shopId, memberId, now: plan.openedAt, asTrainee: plan.byTrainee, timeZone: stage.timeZone };
  const suspect = Array.from({ length: random() < 0.2 ? 2 : 1 }, stage.uuid);
  const used = ["clean", "activate", "strike"].flatMap(
    (station) => solutionAt(stage.solutions, station, plan.job.method, plan.openedAt) ?? [],
  );
  const { ref, id } = openCase(tx, snapper, {
    snapKey: stage.uuid(),
    photoIds: suspect,
    workOrderId: stage.jobIds.get(plan.job.number) ?? 0,
    runId: logRun(tx, stage, plan, memberId, runNumber),
    baseMetal: plan.job.baseMetal,
    alloy: plan.job.alloy,
    method: plan.job.method,
    foundStationId: stage.stationIds.get(plan.stageFound === "at-strike" ? "inspect" : "finish") ?? 0,
    // A solution that has been changed since is out of use by now; the snap was sent while it was not.
    solutionIds: used.filter((each) => each.untilAt === Infinity).map((each) => each.id),
    stageFound: plan.stageFound,
    quantity: plan.quantity,
    symptoms: plan.symptoms,
    note: plan.note,
    calledClass: plan.called,
    sure: plan.sure,
  });
  if (!plan.byTrainee && random() < 0.3) {
    const classSlug = random() < 0.55 && plan.fault !== "sound" ? plan.fault : "water-spots";
    addCall(
      tx,
      { shopId, memberId: crew.trainee, asTrainee: true, now: plan.openedAt + 9 * MINUTE_MS },
      { caseId: id, round: 1, kind: "further", classSlug, sure: 2 },
    );
  }
  const restrike = play(tx, stage, plan, ref, memberId);
  return { plan, caseId: id, suspect, restrike, memberId };
}

function logRun(tx: Handle, stage: DemoStage, plan: DemoCase, memberId: number, runNumber: number): number {
  const workOrderId = stage.jobIds.get(plan.job.number) ?? 0;
  const struck = plan.quantity + 20 + Math.floor(stage.random() * 60);
  return tx
    .insert(runs)
    .values({
      shopId: stage.shopId,
      code: `R-${String(runNumber).padStart(4, "0")}`,
      workOrderId,
      method: plan.job.method,
      memberId,
      partsStruck: struck,
      struckAt: plan.openedAt - 12 * MINUTE_MS,
    })
    .returning({ id: runs.id })
    .get().id;
}

/** From the second look to where the plan says the case stands. */
function play(tx: Handle, stage: DemoStage, plan: DemoCase, ref: string, platerId: number): DemoShots["restrike"] {
  const { shopId, crew, random } = stage;
  const senior = { shopId, memberId: crew.senior, asTrainee: false };
  const hands = plan.byTrainee ? crew.platers[0] : platerId;
  const standing = () => requireCase(tx, shopId, ref);
  const shots: DemoShots["restrike"] = [];
  if (plan.end.state === "held" && plan.outcomes.length === 0) return shots;

  // An open case must not have been confirmed later than now.
  const wait = plan.end.state === "closed" ? 20 + random() * 100 : 10 + random() * 20;
  let clock = plan.openedAt + wait * MINUTE_MS;
  if (plan.end.state === "closed" && plan.end.closing === "released") {
    releaseCase(tx, { ...senior, now: clock }, standing(), "Only the light on a wet part");
    return shots;
  }
  const rounds =
    plan.end.state === "closed" || plan.end.state === "held" ? plan.outcomes.length : plan.outcomes.length + 1;
  for (let round = 1; round <= rounds; round += 1) {
    const { causeId, fix } = chooseFix(tx, stage, plan.fault);
    const isLast = round === rounds;
    if (isLast && plan.end.state === "closed" && plan.end.closing === "concession") {
      confirmCase(tx, { ...senior, now: clock }, standing(), {
        ref,
        classSlug: plan.fault,
        causeId,
        sure: 3,
        disposition: "concession",
        why: "Inside face, the customer agreed by phone",
        fixId: undefined,
        cardTitle: "",
        steps: [],
      });
      return shots;
    }
    confirmCase(tx, { ...senior, now: clock }, standing(), {
      ref,
      classSlug: plan.fault,
      causeId,
      sure: 3,
      disposition: "rework",
      why: "",
      fixId: fix.id,
      cardTitle: fix.title,
      steps: fix.steps,
    });
    if (plan.end.state === "confirmed" && isLast) return shots;
    const most = plan.end.state === "in-rework" && isLast ? plan.end.ticked : Infinity;
    clock = tickCard(tx, { shopId, memberId: hands }, standing, clock + 15 * MINUTE_MS, most, random);
    if (plan.end.state === "in-rework" && isLast) return shots;
    if (isLast && plan.end.state === "closed" && plan.end.closing === "scrap") {
      disposeCase(tx, { ...senior, now: clock }, standing(), {
        disposition: "scrap",
        why: "The base metal is eaten under the copper",
      });
      return shots;
    }
    const outcome = plan.outcomes[round - 1] ?? "sound";
    // A second round always shows what went wrong; otherwise some outcomes rest on a note, as in a busy shop.
    const shot =
      outcome !== "sound" || random() < 0.6 ? { id: stage.uuid(), isSound: outcome === "sound", round } : null;
    recordOutcome(tx, { shopId, memberId: hands, now: clock }, standing(), {
      ref,
      outcome,
      note: outcome === "sound" ? "Tape clean." : "Still there after the re-strike.",
      photoIds: shot ? [shot.id] : [],
    });
    if (shot) shots.push(shot);
    clock += (12 + random() * 40) * MINUTE_MS;
  }
  return shots;
}

function tickCard(
  tx: Handle,
  hands: { shopId: number; memberId: number },
  standing: () => ReturnType<typeof requireCase>,
  from: number,
  most: number,
  random: Random,
): number {
  const row = standing();
  const steps = tx
    .select({ id: reworkSteps.id, plannedMinutes: reworkSteps.plannedMinutes })
    .from(reworkSteps)
    .innerJoin(reworkCards, eq(reworkCards.id, reworkSteps.cardId))
    .where(and(eq(reworkCards.shopId, hands.shopId), eq(reworkCards.caseId, row.id), eq(reworkCards.round, row.round)))
    .orderBy(asc(reworkSteps.position))
    .all();
  let clock = from;
  for (const step of steps.slice(0, most)) {
    const spentMinutes = Math.max(1, Math.round(step.plannedMinutes * (0.7 + random() * 0.8)));
    clock += spentMinutes * MINUTE_MS;
    tickStep(tx, { ...hands, now: Math.round(clock) }, standing(), { stepId: step.id, spentMinutes });
  }
  return Math.round(clock);
}

/** A cause of the class by its likelihood on the shelf, and the first fix for it. */
function chooseFix(
  tx: Handle,
  stage: DemoStage,
  classSlug: string,
): { causeId: number; fix: { id: number; title: string; steps: CardStepInput[] } } {
  const causes = tx
    .select({ id: libraryCauses.id, slug: libraryCauses.slug, weight: libraryCauses.likelihood })
    .from(libraryClassCauses)
    .innerJoin(
      libraryCauses,
      and(eq(libraryCauses.shopId, libraryClassCauses.shopId), eq(libraryCauses.slug, libraryClassCauses.causeSlug)),
    )
    .where(and(eq(libraryClassCauses.shopId, stage.shopId), eq(libraryClassCauses.classSlug, classSlug)))
    .all();
  // Most of what an activator past its window spoils is put down to just that, as in the demo shop's story.
  const cause = pick(
    stage.random,
    causes.map((each) => (each.slug === "activator-spent" ? { ...each, weight: each.weight * 6 } : each)),
  );
  const fix = tx
    .select({ id: libraryFixes.id, title: libraryFixes.title, steps: libraryFixes.steps })
    .from(libraryCauseFixes)
    .innerJoin(
      libraryFixes,
      and(eq(libraryFixes.shopId, libraryCauseFixes.shopId), eq(libraryFixes.slug, libraryCauseFixes.fixSlug)),
    )
    .where(and(eq(libraryCauseFixes.shopId, stage.shopId), eq(libraryCauseFixes.causeSlug, cause.slug)))
    .orderBy(asc(libraryCauseFixes.position))
    .get();
  if (!fix) throw new Error(`The shelf has no fix for ${cause.slug}.`);
  const steps = fix.steps.map(({ title, detail, minutes, cautionKeys }) => ({
    title,
    detail,
    plannedMinutes: Math.max(1, Math.round(minutes)),
    cautionKeys,
  }));
  return { causeId: cause.id, fix: { ...fix, steps } };
}
