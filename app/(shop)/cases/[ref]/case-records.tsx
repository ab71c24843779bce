import { CallsTable } from "@/components/cases/case-calls";
import { CaseCards } from "@/components/cases/case-cards";
import { CaseMoneyTable } from "@/components/cases/case-money";
import { LinkButton } from "@/components/ui/button";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { getCaseMoney } from "@/db/queries/case-costs";
import type { CaseFacts } from "@/db/queries/case-page";
import type { SignedIn } from "@/db/queries/crew";
import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
import { can } from "@/lib/permissions";
import { routes } from "@/lib/routes";
import type { LoadedCase } from "./load-case";

interface RecordsProps {
  member: SignedIn;
  facts: CaseFacts;
  loaded: LoadedCase;
}

/** What was called, what was done, and what it cost to those who may see it. */
export function CaseRecords({ member, facts, loaded }: RecordsProps) {
  return (
    <div className="case-records">
      <Section title="Calls" aside={counted(loaded.calls.length, "call")}>
        <CallsTable calls={loaded.calls} caption="Calls on this case" />
      </Section>
      <Section title={loaded.cards.length > 1 ? "Rework cards" : "Rework card"}>
        {loaded.cards.length === 0 ? (
          <p className="small quiet">No card was sent for this case.</p>
        ) : (
          <CaseCards cards={loaded.cards} />
        )}
      </Section>
      {can(member, "money.case") && <MoneySection member={member} facts={facts} />}
    </div>
  );
}

function MoneySection({ member, facts }: Pick<RecordsProps, "member" | "facts">) {
  const money = getCaseMoney(getDb(), member.shopId, facts.id);
  if (!money) return null;
  return (
    <Section title="Cost" aside={facts.round > 1 ? `${facts.round} rounds` : undefined}>
      <CaseMoneyTable
        estimate={money.estimate}
        recorded={money.recorded}
        atRisk={money.atRisk}
        currency={member.shop.currency}
        quantity={facts.quantity}
        ratesFrom={dayWords(money.rates.validFromAt, member.shop.timeZone)}
        assumed={money.assumed}
      />
      {can(member, "strip.estimate") && (
        <p className="mt-3">
          <LinkButton href={routes.strip({ case: facts.ref })} glyph="station-strike">
            Work out the strip
          </LinkButton>
        </p>
      )}
    </Section>
  );
}
