import { placeholderUrl } from "@/components/photos/placeholder-url";
import type { AgainstClass, AlikeView } from "@/components/cases/second-look-against";
import type { Db } from "@/db/open";
import type { CaseFacts } from "@/db/queries/case-page";
import { listCaseCalls, listCaseShots, listCaseSolutions, type CaseCall } from "@/db/queries/case-records";
import { listPhotosOfCases } from "@/db/queries/photos";
import {
  countConfirmed,
  getShelf,
  listAlike,
  listExemplars,
  type AlikeCase,
  type ShelfRows,
} from "@/db/queries/second-look-against";
import { chooseClasses } from "@/lib/cases/class-choice";
import { RELEASE } from "@/lib/cases/second-look-form";
import { offerForCase } from "@/lib/cases/second-look-offer";
import { tagStanding } from "@/lib/cases/tag-standing";

/** Classes offered at once; more hide the causes below the fold of a bench screen. */
const OFFERED = 5;
/** Classes whose exemplar stands beside the photo. */
const COMPARED = 3;
const ALIKE = 4;

/** Everything that the second look of one case lays side by side. */
export function loadSecondLook(db: Db, shopId: number, facts: CaseFacts, now: number) {
  const calls = listCaseCalls(db, shopId, facts.id);
  const shelf = getShelf(db, shopId);
  const counts = countConfirmed(db, shopId);
  const called = calledClasses(facts, calls);
  const faults = shelf.classes.filter((each) => each.slug !== RELEASE);
  const { first, rest } = chooseClasses({
    classes: faults.map(({ slug, tells }) => ({ slug, lookAlikes: tells.map((tell) => tell.versus) })),
    called,
    counts: counts.byClass,
    most: OFFERED,
  });
  return {
    calls,
    shots: listCaseShots(db, shopId, facts.id),
    solutions: listCaseSolutions(db, shopId, facts.id),
    first,
    rest,
    startWith: called.find((slug) => slug === RELEASE || first.includes(slug)) ?? null,
    offer: offerForCase(shelf, { baseMetal: facts.baseMetal, quantity: facts.quantity, countByCause: counts.byCause }),
    against: against(db, shopId, shelf, first, facts),
    alike: alike(db, shopId, { ...facts, classSlug: called[0] ?? null }, now),
  };
}

/** Classes called in this round, the newest call first; in a later round also the one that did not hold. */
function calledClasses(facts: CaseFacts, calls: readonly CaseCall[]): string[] {
  const inRound = calls.filter((call) => call.round === facts.round).toReversed();
  const slugs = [...inRound.map((call) => call.classSlug), facts.calledClass, facts.confirmedClass];
  return [...new Set(slugs.filter((slug) => slug !== null))];
}

function against(db: Db, shopId: number, shelf: ShelfRows, first: readonly string[], facts: CaseFacts): AgainstClass[] {
  const slugs = first.slice(0, COMPARED);
  const exemplars = listExemplars(db, shopId, slugs);
  const lead = shelf.classes.find((each) => each.slug === slugs[0]);
  return slugs.flatMap((slug, index) => {
    const row = shelf.classes.find((each) => each.slug === slug);
    if (!row) return [];
    const ofClass = exemplars.filter((each) => each.classSlug === slug);
    const chosen = ofClass.find((each) => each.baseMetal === facts.baseMetal) ?? ofClass[0];
    return {
      slug,
      title: row.title,
      tell: lead?.tells.find((tell) => tell.versus === slug)?.tell ?? row.short,
      keyCap: String(index + 1),
      exemplar: chosen
        ? {
            photoId: chosen.photoId,
            caseRef: chosen.ref,
            placeholder: placeholderUrl(chosen.placeholder),
            isRendered: chosen.isRendered,
          }
        : null,
    };
  });
}

function alike(db: Db, shopId: number, of: Parameters<typeof listAlike>[2], now: number): AlikeView[] {
  const rows = listAlike(db, shopId, of, ALIKE);
  const photos = listPhotosOfCases(
    db,
    shopId,
    rows.map((row) => row.id),
  );
  return rows.map((row) => {
    const photo = photos.get(row.id);
    return {
      caseRef: row.ref,
      classTitle: row.classTitle,
      end: endWords(row, now),
      photo:
        photo?.state === "ready"
          ? { id: photo.id, placeholder: placeholderUrl(photo.placeholder), isRendered: photo.isRendered }
          : null,
    };
  });
}

/** "sound in round 2" */
function endWords(row: AlikeCase, now: number): string {
  const standing = tagStanding({ state: "closed", closing: row.closing, round: row.round, heldAt: row.openedAt }, now);
  return standing.words.replace(/^Closed, /, "").toLowerCase();
}
