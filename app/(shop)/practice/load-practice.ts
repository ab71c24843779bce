import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { listTellableClasses } from "@/db/queries/practice-classes";
import { listDrillsFor } from "@/db/queries/practice-drills";
import { listAnswers, listDrillAnswers } from "@/db/queries/practice-questions";
import { drillStanding } from "@/lib/practice/drill";
import { SITTING } from "@/lib/practice/practice-words";
import { firstAnswers, scoreOf } from "@/lib/practice/progress";
import { agreementOf } from "@/lib/cases/agreement-words";
import { choosePhoto, drillPhotos, waitingPhotos, type Asker } from "@/lib/server/practice/choose-photo";

/** What practice has for this person now: set drills, what is due, and how their eye stands. */
export function loadPractice(db: Db, member: SignedIn, now: number) {
  const asker: Asker = { db, member, now };
  const shelf = listTellableClasses(db, member.shopId);
  const titleOf = (slug: string) => shelf.find((each) => each.slug === slug)?.title ?? slug;
  const answers = listAnswers(db, member.shopId, member.memberId);
  const firsts = firstAnswers(answers);
  const { due, fresh } = waitingFor(asker);
  const { worst } = agreementOf(firsts);
  return {
    due,
    fresh,
    /** Something to ask, be it early. */
    canAsk: due + fresh > 0 || choosePhoto(asker, null) !== null,
    drills: listDrillsFor(db, member.shopId, member.memberId).map((drill) => {
      const done = listDrillAnswers(db, member.shopId, member.memberId, drill.id);
      const right = done.filter((answer) => answer.called === answer.confirmed).length;
      const standing = drillStanding(
        { called: done.length, right },
        drill.photoCount,
        drillPhotos(asker, drill).length,
      );
      return { ...drill, standing, classTitles: drill.classSlugs.map(titleOf) };
    }),
    score: scoreOf(firsts),
    answers: answers.length,
    worst: worst && {
      ...worst,
      called: titleOf(worst.called),
      confirmed: titleOf(worst.confirmed),
      slug: worst.confirmed,
    },
  };
}

/** How many photos are due, and how many new ones make up a sitting. */
export function waitingFor(asker: Asker): { due: number; fresh: number } {
  const { due, fresh } = waitingPhotos(asker);
  return { due: due.length, fresh: Math.min(SITTING, fresh.length) };
}
