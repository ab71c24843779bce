import type { Metadata } from "next";
import Link from "next/link";
import { RatesDesk, type RatesDeskProps } from "@/components/costs/rates-desk";
import type { RatesGroup } from "@/components/costs/rates-form";
import { RatesHistory, type RatesRowStory } from "@/components/costs/rates-history";
import { markWords } from "@/components/costs/rates-timeline";
import { ShopShell } from "@/components/shell/shop-shell";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import { getDb } from "@/db/client";
import { countOpenCases } from "@/db/queries/rate-examples";
import {
  getRatesAt,
  listMetalsInUse,
  listRatesHistory,
  type DatedRates,
  type RatesHistoryRow,
} from "@/db/queries/rates";
import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
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
import { getRatesBench } from "@/lib/server/costs/rate-examples";
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
  const history = ratesStory(listRatesHistory(db, member.shopId), now, currency);
  const stories = history.map((story) => storyView(story, timeZone));
  const ahead = stories.findLast((story) => story.standing === "ahead");
  const open = countOpenCases(db, member.shopId);
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
      <RatesDesk
        id={FORM_ID}
        groups={groupsOf(held, listMetalsInUse(db, member.shopId), currency)}
        today={dayOf(now, timeZone)}
        todayWords={shortDay(now, timeZone)}
        held={figuresOf(held)}
        currency={currency}
        bench={getRatesBench(db, member.shopId, now)}
        lead={`These rates hold since ${dayWords(held.validFromAt, timeZone)}.${ahead ? ` New ones start on ${ahead.from}.` : ""}`}
        below={<Below open={open} currency={currency} isStarting={held.source === STARTING_RATES_SOURCE} />}
        marks={marksOf(history, timeZone)}
        aside={`Now: ${held.source}`}
        history={<RatesHistory rows={stories} />}
        action={addRates}
      />
    </ShopShell>
  );
}

interface BelowProps {
  open: number;
  currency: string;
  isStarting: boolean;
}

function Below({ open, currency, isStarting }: BelowProps) {
  const stays = open === 0 ? "" : `, and so ${open === 1 ? "does" : "do"} the ${counted(open, "open case")}`;
  return (
    <>
      <Rests>
        A case keeps the rates of its day: what is closed stays as it is{stays}. Rows are added, never changed; a
        mistake is corrected by a later row. Currency: {currency}, before tax.
      </Rests>
      {isStarting && (
        <Note tone="amber" title="These are starting rates, from memory">
          Every cost rests on them until the shop sets its own.
        </Note>
      )}
    </>
  );
}

type Story = ReturnType<typeof ratesStory<RatesHistoryRow>>[number];

/** Rows that have passed: so many fit on the line of time beside the one that holds and those ahead. */
const PAST_MARKS = 2;

/** The row that holds with its neighbours, the earliest first. */
function marksOf(history: readonly Story[], timeZone: string): RatesDeskProps["marks"] {
  const isPast = ({ standing }: Story) => standing === "before";
  const past = history.filter(isPast).slice(0, PAST_MARKS);
  return history
    .filter((story) => !isPast(story) || past.includes(story))
    .toReversed()
    .map(({ row, standing, changes }) => ({
      id: String(row.id),
      day: dayOf(row.validFromAt, timeZone),
      from: dayWords(row.validFromAt, timeZone),
      standing,
      words: markWords(changes),
    }));
}

function shortDay(at: number, timeZone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone, day: "numeric", month: "short" }).format(at);
}

/** The figures alone, as the browser needs them. */
function figuresOf(rates: DatedRates): RateFigures {
  const { id: _id, source: _source, validFromAt: _from, ...figures } = rates;
  return figures;
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

function storyView({ row, standing, changes }: Story, timeZone: string): RatesRowStory {
  return {
    id: row.id,
    from: dayWords(row.validFromAt, timeZone),
    standing,
    changes,
    setBy: row.setByName ? `${row.setByName}, ${dayWords(row.setAt, timeZone)}` : "Came with the shop",
    source: row.rates.source,
  };
}
