import type { Metadata } from "next";
import { SnapSheet } from "@/components/cases/snap-sheet";
import { ShopShell } from "@/components/shell/shop-shell";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import { getLastSnap, listSeniorNames, listSnapChoices } from "@/db/queries/snap-choices";
import { sameAsLast } from "@/lib/cases/same-as-last";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

export const metadata: Metadata = { title: "Snap" };

/** A suspect part goes on hold: photo, facts, symptoms, first call, tag. */
export default async function SnapPage() {
  const member = await guardPage("case.snap", routes.snap());
  const db = getDb();
  const choices = listSnapChoices(db, member.shopId);
  const { facts, isLast } = sameAsLast(choices, getLastSnap(db, member.shopId, member.memberId));
  const { actor, counts } = shellFor(member);
  const seniors = listSeniorNames(db, member.shopId).map((name) => name.split(" ")[0] ?? name);
  return (
    // The sheet brings its own thumb bar: its main action changes with what it shows.
    <ShopShell actor={actor} counts={counts} here="snap" thumb={<></>} className="snap-page">
      <noscript>
        <Note tone="amber" title="The snap needs script">
          This browser runs none, so it can send no photos. Write HOLD on the rack tag and tell a senior tech.
        </Note>
      </noscript>
      <SnapSheet
        choices={choices}
        facts={facts}
        isLast={isLast}
        now={Date.now()}
        seniors={seniors}
        member={{
          memberId: member.memberId,
          name: member.name,
          isTrainee: member.roles.every((role) => role === "trainee"),
          timeZone: member.shop.timeZone,
        }}
      />
    </ShopShell>
  );
}
