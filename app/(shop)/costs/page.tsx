import type { Metadata } from "next";
import Link from "next/link";
import { Suspense } from "react";
import { LedgerTable } from "@/components/costs/ledger-table";
import { ParetoChart } from "@/components/costs/pareto-chart";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import { ShopShell } from "@/components/shell/shop-shell";
import { LinkButton } from "@/components/ui/button";
import { DataTable } from "@/components/ui/data-table";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { countLedgerBasis, listCostBy, listCostByStage } from "@/db/queries/ledger";
import { getStation } from "@/db/queries/line";
import { getRatesAt } from "@/db/queries/rates";
import { STAGE_TITLES, STAGES_FOUND } from "@/lib/cases/case-words";
import { dayWords } from "@/lib/cases/moment-words";
import { counted } from "@/lib/cases/part-words";
import { ledgerHref, LEDGER_FILTER } from "@/lib/costs/ledger-href";
import { LEDGER_GROUP_TITLES, LEDGER_GROUPS, ledgerSchema, type LedgerQuery } from "@/lib/costs/ledger.schema";
import { ledgerRows, type LedgerRow } from "@/lib/costs/ledger-view";
import { lastSpan, periodOf, SPAN_WORDS, SPANS, type Period } from "@/lib/costs/period";
import { formatMoney } from "@/lib/money";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { CheckPanel } from "./check-panel";

export const metadata: Metadata = { title: "Ledger" };

interface LedgerPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** Bars that keep their name; the rest is gathered. */
const MOST_BARS = 7;

/** What rework cost, by cause first. Every bar opens the cases behind it. */
export default async function LedgerPage({ searchParams }: LedgerPageProps) {
  const member = await guardPage("ledger.see", routes.ledger());
  const parsed = ledgerSchema.safeParse(await searchParams);
  const query = parsed.success ? parsed.data : ledgerSchema.parse({});
  const { timeZone, currency } = member.shop;
  const now = Date.now();
  const period = readPeriod(query, now, timeZone);
  const db = getDb();
  const station = query.station ? getStation(db, member.shopId, query.station) : null;
  const scope = { fromAt: period.fromAt, untilAt: period.untilAt, stationId: station?.id ?? null };
  const amounts = listCostBy(db, member.shopId, query.by, scope);
  const { rows, totalCents } = ledgerRows(amounts, MOST_BARS);
  const all = ledgerRows(amounts).rows;
  const stages = listCostByStage(db, member.shopId, scope);
  const basis = countLedgerBasis(db, member.shopId, scope);
  const rates = getRatesAt(db, member.shopId, now);
  const money = (cents: number) => formatMoney(cents, currency, { whole: true });
  const casesOf = (row: LedgerRow) => casesHref(row, query, period);
  const { actor, counts, stations } = shellFor(member);
  const span = query.from
    ? `${dayWords(period.fromAt, timeZone)} to ${dayWords(period.untilAt - 1, timeZone)}`
    : `in ${SPAN_WORDS[query.span]}`;

  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="ledger"
      strip={
        <LineStrip
          mode="full"
          stations={stations}
          pressed={station?.slug ?? null}
          hrefFor={(to) => ledgerHref(query, { station: to ?? undefined })}
        />
      }
      narrowed={
        station && (
          <NarrowedBar
            station={station.name}
            words={`${money(totalCents)} traces back to it`}
            clearHref={ledgerHref(query, { station: undefined })}
          />
        )
      }
    >
      {!parsed.success && (
        <Note tone="amber" glyph="ui-caution" title="This address was not understood">
          {parsed.error.issues[0]?.message} The last 30 days are shown.
        </Note>
      )}
      <div className="ledger-head">
        <div>
          <Lead>{leadWords(all, totalCents, money, span)}</Lead>
          <Rests>
            {counted(basis.recorded + basis.estimated, "closed case")}: {basis.recorded} at recorded cost,{" "}
            {basis.estimated} at estimate. {counted(basis.open.cases, "case")} still open, {money(basis.open.costCents)}{" "}
            at estimate, not in the sum. Rates since {dayWords(rates.validFromAt, timeZone)}: {rates.source}.
          </Rests>
        </div>
        <nav className="ledger-spans btns" aria-label="Period">
          {SPANS.map((each) => (
            <LinkButton
              key={each}
              href={ledgerHref(query, { span: each, from: undefined, to: undefined })}
              aria-current={!query.from && query.span === each ? "true" : undefined}
            >
              {SPAN_WORDS[each]}
            </LinkButton>
          ))}
        </nav>
      </div>
      <div className="ledger-grid">
        <Section title="Where it went" aside="Press a bar for its cases">
          <nav className="ledger-by" aria-label="Add up by">
            {LEDGER_GROUPS.map((by) => (
              <Link
                key={by}
                href={ledgerHref(query, { by })}
                aria-current={query.by === by ? "true" : undefined}
                scroll={false}
              >
                {`By ${LEDGER_GROUP_TITLES[by].toLowerCase()}`}
              </Link>
            ))}
          </nav>
          {rows.length === 0 ? (
            <Empty title="Nothing was reworked in this time.">Choose a longer time, or show the whole line.</Empty>
          ) : (
            <ParetoChart
              rows={rows}
              money={money}
              hrefFor={casesOf}
              label={`Rework cost by ${LEDGER_GROUP_TITLES[query.by].toLowerCase()}`}
            />
          )}
        </Section>
        <Section
          title="Found where"
          aside={counted(
            stages.reduce((sum, row) => sum + row.cases, 0),
            "case",
          )}
        >
          <DataTable
            caption="Cost by the stage at which the fault was found"
            columns={[
              { key: "stage", head: "Stage", cell: (stage) => STAGE_TITLES[stage] },
              {
                key: "cases",
                head: "Cases",
                numeric: true,
                cell: (stage) => stages.find((row) => row.stage === stage)?.cases ?? 0,
              },
              {
                key: "cost",
                head: "Cost",
                numeric: true,
                cell: (stage) => money(stages.find((row) => row.stage === stage)?.costCents ?? 0),
              },
            ]}
            rows={STAGES_FOUND}
            rowKey={(stage) => stage}
            foot={["All", stages.reduce((sum, row) => sum + row.cases, 0), money(totalCents)]}
          />
          <p>
            <Link className="solo" href={routes.rates()}>
              Rates that these rest on
            </Link>
          </p>
        </Section>
      </div>
      <Suspense fallback={<p role="status">Adding up the runs.</p>}>
        <CheckPanel
          shopId={member.shopId}
          currency={currency}
          period={period}
          periodWords={query.from ? `from ${span}` : `in the last ${SPAN_WORDS[query.span]}`}
          now={now}
        />
      </Suspense>
      {all.length > 0 && (
        <LedgerTable
          rows={all}
          by={query.by}
          money={(cents) => formatMoney(cents, currency)}
          totalCents={totalCents}
          hrefFor={casesOf}
        />
      )}
    </ShopShell>
  );
}

function readPeriod(query: LedgerQuery, now: number, timeZone: string): Period {
  return query.from && query.to && query.from <= query.to
    ? periodOf(query.from, query.to, timeZone)
    : lastSpan(query.span, now, timeZone);
}

function leadWords(rows: LedgerRow[], totalCents: number, money: (cents: number) => string, span: string): string {
  const first = rows[0];
  if (!first || totalCents === 0) return `No money went into rework ${span}.`;
  return `${money(totalCents)} went into rework ${span}. ${money(first.cost)} of it: ${first.label.charAt(0).toLowerCase()}${first.label.slice(1)}.`;
}

function casesHref(row: LedgerRow, query: LedgerQuery, period: Period): string | null {
  if (row.key === "other" || row.key === "") return null;
  return routes.casebook({
    [LEDGER_FILTER[query.by]]: row.key,
    status: "closed",
    closedFrom: period.from,
    closedTo: period.to,
    ...(query.station ? { station: query.station } : {}),
  });
}
