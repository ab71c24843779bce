import { and, asc, eq, isNull } from "drizzle-orm";
import { keepCall, putQuestion } from "@/db/changes/practice-call";
import { setDrill } from "@/db/changes/practice-drill";
import type { Handle } from "@/db/open";
import { listTellableClasses } from "@/db/queries/practice-classes";
import { listDuePhotos, listPhotosOfClasses } from "@/db/queries/practice-photos";
import { getQuestion } from "@/db/queries/practice-questions";
import { cases, memberRoles, members, practiceQuestions } from "@/db/schema";
import { seededRandom, type Random } from "@/db/seed/photos/random";
import type { Sureness } from "@/lib/cases/case-words";
import type { Askable } from "@/lib/practice/next-photo";

const DAY_MS = 86_400_000;
/** Days of practice, the last of them yesterday. */
const DAYS = 9;
const PHOTOS_A_DAY = 5;

/** What the invented trainee takes for what, and how often of ten. */
const MIX_UPS: Readonly<Record<string, readonly [string, number]>> = {
  dewetting: ["underactivation", 4],
  underactivation: ["dewetting", 3],
  overactivation: ["burning", 4],
  "water-spots": ["oxidation", 3],
  "no-deposit": ["dewetting", 4],
  sound: ["oxidation", 2],
};

/**
 * Some days of practice of the shop's trainee, and a drill that the senior set, played through the product's own
 * changes. Only photos that were confirmed by the day they are called on.
 */
export function playPractice(tx: Handle, shopId: number, now: number): void {
  const trainee = firstWith(tx, shopId, "trainee");
  const senior = firstWith(tx, shopId, "senior");
  if (trainee === null || senior === null) return;
  const random = seededRandom(31);
  for (let day = DAYS; day >= 1; day -= 1) {
    for (let photo = 0; photo < PHOTOS_A_DAY; photo += 1) {
      callOne(tx, { shopId, memberId: trainee, now: now - day * DAY_MS + photo * 90_000 }, random, null);
    }
  }
  const drillId = setDrill(
    tx,
    { shopId, memberId: senior, now: now - DAY_MS },
    {
      title: "Dewetting or underactivation?",
      classSlugs: ["dewetting", "underactivation"],
      photoCount: 8,
      memberIds: [trainee],
      dueAt: now + 5 * DAY_MS,
    },
  );
  for (let photo = 0; photo < 3; photo += 1) {
    callOne(tx, { shopId, memberId: trainee, now: now - 3_600_000 + photo * 60_000 }, random, drillId);
  }
}

interface Caller {
  shopId: number;
  memberId: number;
  now: number;
}

function callOne(tx: Handle, caller: Caller, random: Random, drillId: number | null): void {
  const photo = choose(tx, caller, random, drillId);
  if (!photo) return;
  const id = questionNumber(random);
  putQuestion(tx, caller, { id, photoId: photo.photoId, caseId: photo.caseId, drillId });
  const question = getQuestion(tx, caller.shopId, caller.memberId, id);
  if (!question) return;
  keepCall(tx, caller, question, { ...calledAs(photo.classSlug, random), confirmedClass: photo.classSlug });
}

/** What comes back that day, else something new; never the part called last. */
function choose(tx: Handle, caller: Caller, random: Random, drillId: number | null): Askable | undefined {
  const slugs = listTellableClasses(tx, caller.shopId).map((each) => each.slug);
  const last = tx
    .select({ caseId: practiceQuestions.caseId })
    .from(practiceQuestions)
    .where(eq(practiceQuestions.askedAt, caller.now - (drillId === null ? 90_000 : 60_000)))
    .get();
  const mayAsk = (photo: Askable) => photo.caseId !== last?.caseId && wasConfirmed(tx, photo.caseId, caller.now);
  const due = drillId === null ? listDuePhotos(tx, caller, caller.now).filter(mayAsk) : [];
  if (due[0]) return due[0];
  const fresh = (
    drillId === null
      ? listPhotosOfClasses(tx, caller, slugs, { isNew: true })
      : listPhotosOfClasses(tx, caller, ["dewetting", "underactivation"], { notInDrill: drillId })
  ).filter(mayAsk);
  return fresh[Math.floor(random() * fresh.length)];
}

function wasConfirmed(tx: Handle, caseId: number, at: number): boolean {
  const row = tx.select({ at: cases.confirmedAt }).from(cases).where(eq(cases.id, caseId)).get();
  return typeof row?.at === "number" && row.at < at;
}

function calledAs(slug: string, random: Random): { calledClass: string | null; sure: Sureness } {
  if (random() < 0.06) return { calledClass: null, sure: 1 };
  const [other, ofTen] = MIX_UPS[slug] ?? ["pitting", 1];
  const isMixed = other !== slug && random() * 10 < ofTen;
  const dial = random();
  // Sure at times where it is wrong, and at times only guessing where it is right, as people are.
  const sure: Sureness = isMixed ? (dial < 0.3 ? 1 : dial < 0.85 ? 2 : 3) : dial < 0.15 ? 1 : dial < 0.6 ? 2 : 3;
  return { calledClass: isMixed ? other : slug, sure };
}

/** 128 bits, from the seeded random: demo data is the same each time it is made. */
function questionNumber(random: Random): string {
  return Buffer.from(Array.from({ length: 16 }, () => Math.floor(random() * 256))).toString("base64url");
}

function firstWith(tx: Handle, shopId: number, role: "trainee" | "senior"): number | null {
  const row = tx
    .select({ id: members.id })
    .from(members)
    .innerJoin(memberRoles, and(eq(memberRoles.shopId, members.shopId), eq(memberRoles.memberId, members.id)))
    .where(and(eq(members.shopId, shopId), eq(memberRoles.role, role), isNull(members.removedAt)))
    .orderBy(asc(members.id))
    .get();
  return row?.id ?? null;
}
