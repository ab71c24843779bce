import "server-only";
import { listTellableClasses } from "@/db/queries/practice-classes";
import type { Drill } from "@/db/queries/practice-drills";
import { listDuePhotos, listPhotosOfClasses, type Practising } from "@/db/queries/practice-photos";
import { getAnswer, getLastQuestion, listAnswers } from "@/db/queries/practice-questions";
import type { SignedIn } from "@/db/queries/crew";
import type { Handle } from "@/db/open";
import { dayOf, dayStart, nextDay } from "@/lib/costs/period";
import { confusionOf, type CalledPair } from "@/lib/practice/confusion";
import { nextPhoto, type Askable } from "@/lib/practice/next-photo";

export interface Asker {
  db: Handle;
  member: SignedIn;
  now: number;
  /** A number from 0 up to 1; tests give their own. */
  random?: () => number;
}

const practisingOf = ({ member, now }: Asker): Practising => ({
  shopId: member.shopId,
  memberId: member.memberId,
  now,
});

/** What comes back during the shop's day is due from its beginning on, so that nobody waits for the hour. */
export function dueBefore(member: SignedIn, now: number): number {
  const { timeZone } = member.shop;
  return dayStart(nextDay(dayOf(now, timeZone)), timeZone);
}

/** What waits for this person in their own practice: photos that come back today, and photos they never called. */
export function waitingPhotos(asker: Asker): { due: Askable[]; fresh: Askable[] } {
  const { db, member, now } = asker;
  const who = practisingOf(asker);
  const slugs = listTellableClasses(db, member.shopId).map((each) => each.slug);
  return {
    due: listDuePhotos(db, who, dueBefore(member, now)),
    fresh: listPhotosOfClasses(db, who, slugs, { isNew: true }),
  };
}

/** The photos that a drill can still ask this person. */
export function drillPhotos(asker: Asker, drill: Pick<Drill, "id" | "classSlugs">): Askable[] {
  const { db, member } = asker;
  const slugs = listTellableClasses(db, member.shopId).map((each) => each.slug);
  const wanted = drill.classSlugs.length > 0 ? slugs.filter((slug) => drill.classSlugs.includes(slug)) : slugs;
  return listPhotosOfClasses(db, practisingOf(asker), wanted, { notInDrill: drill.id }).filter((photo) =>
    wanted.includes(photo.classSlug),
  );
}

/** The photo to ask next, in a drill or in one's own practice; null when there is none. */
export function choosePhoto(asker: Asker, drill: Drill | null): Askable | null {
  const { db, member, now, random = Math.random } = asker;
  const shelf = listTellableClasses(db, member.shopId);
  const slugs = shelf.map((each) => each.slug);
  const pairs = listAnswers(db, member.shopId, member.memberId);
  return nextPhoto(drill ? drillPhotos(asker, drill) : ownPhotos(asker, slugs), {
    last: lastAsked(asker),
    confusion: confusionOf(pairs, slugs),
    lookAlikes: (slug) => [
      ...(shelf.find((each) => each.slug === slug)?.tells.map((tell) => tell.versus) ?? []),
      ...mixedWith(pairs, slug),
    ],
    dueBefore: dueBefore(member, now),
    random,
  });
}

/** Due and new photos; with neither, everything, so that who wants to go on early may. */
function ownPhotos(asker: Asker, slugs: readonly string[]): Askable[] {
  const { due, fresh } = waitingPhotos(asker);
  if (due.length + fresh.length > 0) return [...due, ...fresh];
  return listPhotosOfClasses(asker.db, practisingOf(asker), slugs);
}

function lastAsked({ db, member }: Asker): { caseId: number; classSlug: string } | null {
  const last = getLastQuestion(db, member.shopId, member.memberId);
  if (!last) return null;
  return { caseId: last.caseId, classSlug: getAnswer(db, member.shopId, last.id)?.confirmed ?? "" };
}

const mixedWith = (pairs: readonly CalledPair[], slug: string): string[] =>
  pairs.flatMap(({ called, confirmed }) => {
    if (called === null || called === confirmed) return [];
    return confirmed === slug ? [called] : called === slug ? [confirmed] : [];
  });
