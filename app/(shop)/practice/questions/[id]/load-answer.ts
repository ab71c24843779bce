import type { SplitLine } from "@/components/practice/shop-split";
import type { Tell, TellPhoto } from "@/components/practice/tell-apart";
import { placeholderUrl } from "@/components/photos/placeholder-url";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getCauseWords, listTellableClasses, type TellableClass } from "@/db/queries/practice-classes";
import { getAskablePhoto } from "@/db/queries/practice-photos";
import { getAnswer, listAnswers, type PracticeQuestion } from "@/db/queries/practice-questions";
import { splitOf } from "@/db/queries/practice-split";
import { listExemplars } from "@/db/queries/second-look-against";
import { fault } from "@/lib/fault";
import { pairRecord } from "@/lib/practice/confusion";
import { comesBackWords } from "@/lib/practice/practice-words";
import { routes } from "@/lib/routes";
import type { AnsweredQuestion } from "@/lib/server/practice/question-view";

/** Everything that is told once the call is in: the classes, what tells them apart, why it happened, how the shop split. */
export function loadAnswer(db: Db, member: SignedIn, question: PracticeQuestion, view: AnsweredQuestion, now: number) {
  const shelf = listTellableClasses(db, member.shopId);
  const named = (slug: string) => ({ slug, title: shelf.find((each) => each.slug === slug)?.title ?? slug });
  const answer = getAnswer(db, member.shopId, question.id);
  if (!answer) throw fault("not-found", "That photo has not been called yet.");
  const photo = getAskablePhoto(db, member.shopId, question.photoId);
  const other = view.right ? nearestLookAlike(shelf, view.confirmed) : view.called;
  return {
    called: view.called === null ? null : named(view.called),
    confirmed: named(view.confirmed),
    other: other === null ? null : named(other),
    tells: tellsOf(shelf, view.confirmed, other),
    ...pairOf(db, member.shopId, view, other, named),
    cause: photo?.causeId ? getCauseWords(db, member.shopId, photo.causeId) : null,
    // Confirmed anew since the call: the answer keeps what stood then, and says that it stands no longer.
    nowConfirmed: photo && photo.classSlug !== view.confirmed ? named(photo.classSlug) : null,
    split: splitLines(splitOf(db, member.shopId, { ...question, answerId: answer.id }), view.confirmed, named),
    record: recordWords(db, member, view, other, named, now),
  };
}

type Named = (slug: string) => { slug: string; title: string };

const nearestLookAlike = (shelf: readonly TellableClass[], slug: string) =>
  shelf.find((each) => each.slug === slug)?.tells[0]?.versus ?? null;

/** What tells the confirmed class from the other, said from both sides; alone, what it looks like at the strike. */
function tellsOf(shelf: readonly TellableClass[], confirmed: string, other: string | null): Tell[] {
  const entry = (slug: string) => shelf.find((each) => each.slug === slug);
  const side = (slug: string, against: string | null): Tell[] => {
    const from = entry(slug);
    const words = from?.tells.find((tell) => tell.versus === against)?.tell;
    return from && words ? [{ slug, title: from.title, words }] : [];
  };
  const both = other === null ? [] : [...side(confirmed, other), ...side(other, confirmed)];
  if (both.length > 0) return both;
  return [confirmed, other].flatMap((slug) => {
    const from = slug === null ? undefined : entry(slug);
    // The whole of what it looks like for the class that it is, a line for the other.
    return from ? [{ slug: from.slug, title: from.title, words: slug === confirmed ? from.atStrike : from.short }] : [];
  });
}

/** This photo beside the other class at its clearest, where a senior chose an exemplar of it. */
function pairOf(db: Db, shopId: number, view: AnsweredQuestion, other: string | null, named: Named) {
  const exemplar = other === null ? undefined : listExemplars(db, shopId, [other])[0];
  if (!exemplar || other === null) return { pair: [], otherRef: null };
  const pair: TellPhoto[] = [
    {
      src: view.photo.view,
      caption: `This part: ${named(view.confirmed).title.toLowerCase()}`,
      isRendered: view.isRendered,
    },
    {
      src: routes.photo(exemplar.photoId, "view"),
      caption: named(other).title,
      placeholder: placeholderUrl(exemplar.placeholder),
      isRendered: exemplar.isRendered,
    },
  ];
  return { pair, otherRef: exemplar.ref };
}

function splitLines(rows: ReturnType<typeof splitOf>, confirmed: string, named: Named): SplitLine[] {
  return rows.map(({ classSlug, ...counts }) => ({
    slug: classSlug,
    title: classSlug === null ? "Can't tell" : named(classSlug).title,
    isConfirmed: classSlug === confirmed,
    ...counts,
  }));
}

/** "You have mixed this pair 5 times out of 9. It comes back tomorrow." */
function recordWords(
  db: Db,
  member: SignedIn,
  view: AnsweredQuestion,
  other: string | null,
  named: Named,
  now: number,
): string {
  const back =
    view.comesBackAt === null ? "" : `It comes back ${comesBackWords(view.comesBackAt, now, member.shop.timeZone)}.`;
  if (other === null) return back;
  const { mixed, asked } = pairRecord(listAnswers(db, member.shopId, member.memberId), view.confirmed, other);
  if (mixed === 0) return back;
  const pair = `${named(view.confirmed).title.toLowerCase()} and ${named(other).title.toLowerCase()}`;
  return `You have mixed ${pair} ${mixed === 1 ? "once" : `${mixed} times`} out of ${asked}. ${back}`;
}
