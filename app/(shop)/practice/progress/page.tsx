import type { Metadata } from "next";
import Link from "next/link";
import { notFound } from "next/navigation";
import { ShopShell } from "@/components/shell/shop-shell";
import { DataTable } from "@/components/ui/data-table";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { reach } from "@/lib/permissions";
import { LEAST_CALLS } from "@/lib/practice/progress";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { loadPeople, loadProgress, personShown } from "./load-progress";
import { CalibrationSection, ComingBackSection, MixUpSection, ScoreSection } from "./progress-sections";

export const metadata: Metadata = { title: "Practice · Progress" };

/** How an eye stands in practice: one's own, or for seniors anybody's. */
export default async function ProgressPage({ searchParams }: { searchParams: Promise<{ member?: string }> }) {
  const member = await guardPage("practice.do", routes.practiceProgress());
  const { member: asked } = await searchParams;
  const db = getDb();
  const person = personShown(db, member, asked);
  if (!person) notFound();
  const isSelf = person.memberId === member.memberId;
  const progress = loadProgress(db, member.shopId, person.memberId, Date.now(), member.shop.timeZone);
  const { actor, counts } = shellFor(member);
  const { right, calls } = progress.score;
  return (
    <ShopShell actor={actor} counts={counts} here="practice" back={routes.practice()} className="practice">
      <Lead size="page" above={isSelf ? "Your eye in practice" : `${person.name} in practice`}>
        {calls === 0 ? "Nothing was called yet" : `${right} of ${calls} photos called right`}
      </Lead>
      <div className="practice-progress">
        <div>
          <ScoreSection progress={progress} />
          <ComingBackSection progress={progress} />
        </div>
        <CalibrationSection progress={progress} />
      </div>
      <MixUpSection progress={progress} />
      {reach(member.roles, "agreement.see") === "any" && <People shown={person.memberId} shopId={member.shopId} />}
    </ShopShell>
  );
}

function People({ shown, shopId }: { shown: number; shopId: number }) {
  const people = loadPeople(getDb(), shopId);
  return (
    <Section title="Everybody" rests={`First call on each photo. A kappa shows from ${LEAST_CALLS} calls on.`}>
      <DataTable
        caption="Everybody's practice"
        rows={people}
        rowKey={(row) => String(row.memberId)}
        columns={[
          {
            key: "who",
            head: "Who",
            cell: (row) => (
              <Link
                className="solo"
                href={routes.practiceProgress({ member: String(row.memberId) })}
                aria-current={row.memberId === shown ? "true" : undefined}
              >
                {row.name}
              </Link>
            ),
          },
          {
            key: "right",
            head: "Right",
            numeric: true,
            cell: ({ score }) => (score.calls > 0 ? `${score.right} of ${score.calls}` : "nothing yet"),
          },
          {
            key: "kappa",
            head: "Kappa",
            numeric: true,
            cell: ({ score, kappa }) =>
              score.calls >= LEAST_CALLS && kappa.defined
                ? `${kappa.kappa.toFixed(2)} ± ${kappa.standardError.toFixed(2)}`
                : "too few",
          },
        ]}
      />
    </Section>
  );
}
