import type { Db } from "@/db/open";
import { getCrewMember, listCrew, type SignedIn } from "@/db/queries/crew";
import { listTellableClasses } from "@/db/queries/practice-classes";
import { listDueMoments } from "@/db/queries/practice-photos";
import { listAnswers } from "@/db/queries/practice-questions";
import { reach } from "@/lib/permissions";
import { comingBack } from "@/lib/practice/practice-words";
import { calibrationOf, confusionTable, firstAnswers, kappaOf, scoreOf } from "@/lib/practice/progress";

/** How one person's eye stands in practice. */
export function loadProgress(db: Db, shopId: number, memberId: number, now: number, timeZone: string) {
  const shelf = listTellableClasses(db, shopId);
  const answers = listAnswers(db, shopId, memberId);
  const firsts = firstAnswers(answers);
  const later = answers.filter((answer) => !firsts.includes(answer));
  const confusion = confusionTable(
    firsts,
    shelf.map((each) => each.slug),
  );
  return {
    score: scoreOf(firsts),
    again: scoreOf(later),
    kappa: kappaOf(firsts),
    confusion: {
      ...confusion,
      titles: confusion.classes.map((slug) => shelf.find((each) => each.slug === slug)?.title ?? slug),
    },
    calibration: calibrationOf(firsts),
    comingBack: comingBack(listDueMoments(db, shopId, memberId), now, timeZone),
    answers: answers.length,
  };
}

/**
 * Whose progress is shown: one's own, or that of the person asked for where the roles reach to others.
 * @returns null when somebody was asked for who is not in the crew or not theirs to see
 */
export function personShown(db: Db, member: SignedIn, asked: string | undefined) {
  const own = { memberId: member.memberId, name: member.name };
  if (asked === undefined || asked === String(member.memberId)) return own;
  if (reach(member.roles, "agreement.see") !== "any" || !/^\d{1,15}$/.test(asked)) return null;
  return getCrewMember(db, member.shopId, Number(asked));
}

/** Everybody's figures in a line each, for those who may see them. */
export function loadPeople(db: Db, shopId: number) {
  return listCrew(db, shopId).map(({ memberId, name }) => {
    const firsts = firstAnswers(listAnswers(db, shopId, memberId));
    return { memberId, name, score: scoreOf(firsts), kappa: kappaOf(firsts) };
  });
}
