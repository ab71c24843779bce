import type { Metadata } from "next";
import Link from "next/link";
import { RatesForm, type RatesGroup } from "@/components/costs/rates-form";
import { RatesHistory, type RatesRowStory } from "@/components/costs/rates-history";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { getRatesAt, listMetalsInUse, listRatesHistory, type RatesHistoryRow } from "@/db/queries/rates";
import { dayWords } from "@/lib/cases/moment-words";
import { dayOf } from "@/lib/costs/period";
import {
  currencySign,
  fieldText,
  RATE_FIELDS,
  rateWords,
  type RateField,
  type RateFigures,
} from "@/lib/costs/rate-fields";
import { ratesStory } from "@/lib/costs/rates-story";
import { STARTING_RATES_SOURCE } from "@/lib/costs/starting-rates";
import type { DepositMetal } from "@/lib/plating/metals";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { addRates } from "../actions";

export const metadata: Metadata = { title: "Rates" };

const FORM_ID = "rates-form";
const RECOVERED_NOTE = "Recovered is the share of a stripped deposit that comes back as money. Empty: none.";

/** The rates that hold now, a form for those that hold next, and every row there was. */
export default async function RatesPage() {
  const member = await guardPage("rates.set", routes.rates());
  const { timeZone, currency } = member.shop;
  const db = getDb();
  const now = Date.now();
  const held = getRatesAt(db, member.shopId, now);
  const stories = storyViews(listRatesHistory(db, member.shopId), now, timeZone, currency);
  const ahead = stories.findLast((story) => story.standing === "ahead");
  const { actor, counts } = shellFor(member);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="ledger"
      back={routes.ledger()}
      main={{ label: "Save the rates", form: FORM_ID }}
    >
      <p className="lib-crumb">
        <Link href={routes.ledger()}>Ledger</Link>
      </p>
      <div className="rates-head">
        <Lead>
          {`These rates hold since ${dayWords(held.validFromAt, timeZone)}.${ahead ? ` New ones start on ${ahead.from}.` : ""}`}
        </Lead>
        <Rests>
          A case keeps the rates of its day: a new row touches no case snapped before it starts. Rows are added, never
          changed; a mistake is corrected by a later row. Currency: {currency}, before tax.
        </Rests>
        {held.source === STARTING_RATES_SOURCE && (
          <Note tone="amber" title="These are starting rates, from memory">
            Every cost rests on them until the shop sets its own.
          </Note>
        )}
      </div>
      <div className="rates-grid">
        <Section title="Set rates from a day on" aside={`Now: ${held.source}`}>
          <RatesForm
            id={FORM_ID}
            groups={groupsOf(held, listMetalsInUse(db, member.shopId), currency)}
            today={dayOf(now, timeZone)}
            action={addRates}
          />
        </Section>
        <Section title="Rows by date" aside="Latest start first">
          <RatesHistory rows={stories} />
        </Section>
      </div>
    </ShopShell>
  );
}

function groupsOf(held: RateFigures, inUse: readonly DepositMetal[], currency: string): RatesGroup[] {
  const sign = currencySign(currency);
  const isUsed = (field: RateField) => field.metal === undefined || inUse.includes(field.metal);
  const view = (field: RateField) => ({
    name: field.name,
    label: field.label,
    note: field.note,
    now: rateWords(field, field.read(held), currency),
    value: fieldText(field, field.read(held)),
    unit: field.unit === "%" ? "%" : `${sign} / ${field.unit}`,
    optional: field.group === "recovered" || !isUsed(field),
  });
  const rowsOf = (...groups: RateField["group"][]) =>
    RATE_FIELDS.filter((field) => groups.includes(field.group) && isUsed(field)).map(view);
  const others = RATE_FIELDS.filter((field) => !isUsed(field)).map(view);
  return [
    { title: "Time", rows: rowsOf("time") },
    { title: "Metal", note: RECOVERED_NOTE, rows: rowsOf("metal", "recovered") },
    { title: "Solution and waste", rows: rowsOf("solution") },
    ...(others.length > 0 ? [{ title: "Metals that no job here is plated with", rows: others, folded: true }] : []),
  ];
}

function storyViews(rows: RatesHistoryRow[], now: number, timeZone: string, currency: string): RatesRowStory[] {
  return ratesStory(rows, now, currency).map(({ row, standing, changes }) => ({
    id: row.id,
    from: dayWords(row.validFromAt, timeZone),
    standing,
    changes,
    setBy: row.setByName ? `${row.setByName}, ${dayWords(row.setAt, timeZone)}` : "Came with the shop",
    source: row.rates.source,
  }));
}
