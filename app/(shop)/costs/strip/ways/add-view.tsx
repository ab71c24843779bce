import Link from "next/link";
import { StripAddForm } from "@/components/costs/strip-add-form";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Section } from "@/components/ui/section";
import type { SignedIn } from "@/db/queries/crew";
import { metalTitle } from "@/lib/costs/strip-words";
import { DEPOSIT_METALS } from "@/lib/plating/metals";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { addBath } from "./actions";
import { bathFields } from "./way-view";

const FORM_ID = "way";

/** A bath of the shop's own. */
export function AddView({ member }: { member: SignedIn }) {
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="strip"
      back={routes.stripWays()}
      main={{ label: "Add this way", form: FORM_ID }}
    >
      <p className="lib-crumb">
        <Link href={routes.stripWays()}>Ways to strip</Link>
      </p>
      <Lead
        size="page"
        below="It stands after the baths that the shop has for the same deposit; retire those that it replaces."
      >
        Add a way to strip
      </Lead>
      <Section title="The bath">
        <StripAddForm
          id={FORM_ID}
          bath={bathFields(null, member.shop.currency)}
          metals={DEPOSIT_METALS.map((symbol) => ({ symbol, name: metalTitle(symbol) }))}
          action={addBath}
        />
      </Section>
    </ShopShell>
  );
}
