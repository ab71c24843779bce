import type { Metadata } from "next";
import Link from "next/link";
import crewList from "@/components/crew/crew-list.module.css";
import { InviteForm } from "@/components/crew/invite-form";
import { InviteRow } from "@/components/crew/invite-row";
import { MemberRow } from "@/components/crew/member-row";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { listCrew } from "@/db/queries/crew";
import { listPendingInvites } from "@/db/queries/invites";
import { clockWords } from "@/lib/crew/clock-words";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { changeMemberRoles, invitePerson, removeFromCrew, sendInviteAgain, takeInviteBack } from "./actions";

export const metadata: Metadata = { title: "Crew" };

export default async function CrewPage() {
  const member = await guardPage("crew.manage", routes.crew());
  const { actor, counts } = shellFor(member);
  const db = getDb();
  const now = Date.now();
  const crew = listCrew(db, member.shopId);
  const invites = listPendingInvites(db, member.shopId);
  const until = (at: number) =>
    at > now ? `until ${clockWords(at, member.shop.timeZone)}` : "has run out: send it again or take it back";
  return (
    <ShopShell actor={actor} counts={counts} here="crew">
      <Lead below="Who works here, what each may do, and who is on the way.">
        {crew.length === 1 ? "You work here alone" : `${crew.length} people work here`}
      </Lead>
      <div className="cols--main">
        <Section title="Crew" aside={<Link href={routes.audit()}>Who changed what</Link>}>
          <ul className={crewList.list}>
            {crew.map((person) => (
              <MemberRow
                key={person.memberId}
                member={person}
                isSelf={person.memberId === member.memberId}
                onChangeRoles={changeMemberRoles}
                onRemove={removeFromCrew}
              />
            ))}
          </ul>
        </Section>
        <div>
          <Section title="Invite somebody" id="invite" aside={<Link href={routes.outbox()}>Outbox</Link>}>
            <InviteForm action={invitePerson} />
          </Section>
          {invites.length > 0 && (
            <Section title="On the way">
              <ul className={crewList.list}>
                {invites.map((invite) => (
                  <InviteRow
                    key={invite.id}
                    invite={invite}
                    untilWords={until(invite.expiresAt)}
                    onSendAgain={sendInviteAgain}
                    onTakeBack={takeInviteBack}
                  />
                ))}
              </ul>
            </Section>
          )}
        </div>
      </div>
    </ShopShell>
  );
}
