import Link from "next/link";
import { Section } from "@/components/ui/section";
import { TooFew } from "@/components/ui/too-few";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listLibraryTitles } from "@/db/queries/case-records";
import { listCallsAgainstConfirmed } from "@/db/queries/today";
import { agreementOf } from "@/lib/cases/agreement-words";
import { routes } from "@/lib/routes";

const DAYS = 30;
/** Fewer say nothing about an eye. */
const NEEDED = 8;

/** How this person's calls stood against the second looks of the last month. Their own figures, to themselves. */
export function EyeThisMonth({ member, now }: { member: SignedIn; now: number }) {
  const db = getDb();
  const agreement = agreementOf(listCallsAgainstConfirmed(db, member.shopId, member.memberId, now - DAYS * 86_400_000));
  const titles = listLibraryTitles(db, member.shopId).classes;
  const title = (slug: string) => (titles.find((each) => each.slug === slug)?.title ?? slug).toLowerCase();
  if (agreement.calls < NEEDED) {
    return (
      <Section title="Your eye this month">
        <TooFew have={agreement.calls} need={NEEDED} what="confirmed calls">
          Not enough of your calls are confirmed yet.
        </TooFew>
      </Section>
    );
  }
  const { worst } = agreement;
  return (
    <Section
      title="Your eye this month"
      rests={`${agreement.calls} calls confirmed in the last ${DAYS} days. "Can't tell" is not counted.`}
    >
      <p className="prose">
        You and the second look agreed on <strong>{`${agreement.agreed} of ${agreement.calls}`}</strong> calls.
        {worst && ` ${worst.times} times it was ${title(worst.confirmed)} that you called ${title(worst.called)}.`}
      </p>
      {worst && (
        <p>
          <Link className="solo" href={routes.libraryClass(worst.confirmed)}>
            How to tell them apart
          </Link>
        </p>
      )}
    </Section>
  );
}
