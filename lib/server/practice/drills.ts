import "server-only";
import { setDrill as keepDrill, withdrawDrill as takeBackDrill } from "@/db/changes/practice-drill";
import type { Db, Handle } from "@/db/open";
import { listCrew, type SignedIn } from "@/db/queries/crew";
import { listTellableClasses } from "@/db/queries/practice-classes";
import { listPhotosOfClasses } from "@/db/queries/practice-photos";
import { dayStart, nextDay } from "@/lib/costs/period";
import { fault } from "@/lib/fault";
import type { DrillInput } from "@/lib/practice/practice.schema";

interface Doing {
  db: Db;
  member: SignedIn;
  now: number;
}

/**
 * Sets a drill for people of the shop.
 * @throws FaultError "invalid" when a class or a person is not the shop's, when the day is past, or when the shop has
 *   fewer photos of the classes than the drill asks for
 */
export function setDrill({ db, member, now }: Doing, input: DrillInput): { id: number } {
  return db.transaction(
    (tx) => {
      const doer = { shopId: member.shopId, memberId: member.memberId, now };
      demandPeople(tx, doer.shopId, input.memberIds);
      demandPhotos(tx, doer, input);
      const { dueDay, ...drill } = input;
      return { id: keepDrill(tx, doer, { ...drill, dueAt: lastMoment(member, dueDay, now) }) };
    },
    { behavior: "immediate" },
  );
}

/** @throws FaultError "not-found" or "conflict" */
export function withdrawDrill({ db, member, now }: Doing, drillId: number): { id: number } {
  takeBackDrill(db, { shopId: member.shopId, memberId: member.memberId, now }, drillId);
  return { id: drillId };
}

/** The end of the last day, so that "due on the 24th" holds until the 24th is over. */
function lastMoment(member: SignedIn, day: string | undefined, now: number): number | null {
  if (day === undefined) return null;
  const until = dayStart(nextDay(day), member.shop.timeZone, "dueDay");
  if (until > now) return until;
  throw refuse("dueDay", "That day is over. Choose today or later, or none.");
}

function demandPeople(tx: Handle, shopId: number, memberIds: readonly number[]): void {
  const crew = listCrew(tx, shopId);
  if (memberIds.every((id) => crew.some((person) => person.memberId === id))) return;
  throw refuse("memberIds", "Somebody chosen is no longer in the crew. Choose again.");
}

function demandPhotos(tx: Handle, who: { shopId: number; memberId: number; now: number }, input: DrillInput): void {
  const known = listTellableClasses(tx, who.shopId).map((each) => each.slug);
  if (!input.classSlugs.every((slug) => known.includes(slug)))
    throw refuse("classSlugs", "A chosen class is no longer in the library. Choose again.");
  const wanted = input.classSlugs.length > 0 ? input.classSlugs : known;
  const photos = listPhotosOfClasses(tx, who, wanted).filter((photo) => wanted.includes(photo.classSlug)).length;
  if (photos === 0) throw refuse("classSlugs", "The shop has no confirmed photo of these classes yet.");
  if (photos < input.photoCount)
    throw refuse("photoCount", `The shop has ${photos} confirmed photos of these classes. Ask for ${photos} or fewer.`);
}

const refuse = (field: string, words: string) => fault("invalid", words, { [field]: words });
