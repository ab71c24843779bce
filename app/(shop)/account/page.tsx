import type { Metadata } from "next";
import { MailForm, NameForm, PasswordForm } from "@/components/crew/account-forms";
import { SignOutForm } from "@/components/crew/sign-out-form";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import { Slip } from "@/components/ui/slip";
import { getDb } from "@/db/client";
import { listMailRefusals } from "@/db/queries/mail-choices";
import { ROLE_TITLES } from "@/lib/cases/case-words";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { changeMyPassword, chooseMyMails, renameMe, signMeOut, signMeOutEverywhere } from "./actions";

export const metadata: Metadata = { title: "Account" };

export default async function AccountPage() {
  const member = await guardPage("account.edit", routes.account());
  const { actor, counts } = shellFor(member);
  const refused = listMailRefusals(getDb(), member.shopId, member.memberId);
  return (
    <ShopShell actor={actor} counts={counts} here={null}>
      <Lead size="page" below="Night shift and key hints are in the menu at the top right.">
        {member.name}
      </Lead>
      <div className="cols">
        <div>
          <Section title="You">
            <Slip
              rows={[
                { label: "Shop", value: member.shop.name },
                { label: "E-mail", value: member.email },
                { label: "Roles", value: member.roles.map((role) => ROLE_TITLES[role]).join(", ") },
              ]}
            />
          </Section>
          <Section title="Name">
            <NameForm action={renameMe} name={member.name} />
          </Section>
          <Section title="Mails" rests="Invites and password links always come.">
            <MailForm action={chooseMyMails} refused={refused} />
          </Section>
        </div>
        <div>
          <Section title="Password" rests="Changing it signs you out everywhere, here too.">
            <PasswordForm action={changeMyPassword} email={member.email} />
          </Section>
          <Section title="Sign out">
            <div className="btns">
              <SignOutForm action={signMeOut} label="Sign out here" />
              <SignOutForm action={signMeOutEverywhere} label="Sign out everywhere" variant="hold" />
            </div>
          </Section>
        </div>
      </div>
    </ShopShell>
  );
}
