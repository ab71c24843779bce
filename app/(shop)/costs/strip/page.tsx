import type { Metadata } from "next";
import { PrintButton } from "@/components/cases/print-button";
import { STRIP_CHOICE_ID, StripEstimator } from "@/components/costs/strip-estimator";
import { ShopShell } from "@/components/shell/shop-shell";
import { ThumbBar } from "@/components/shell/thumb-bar";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import { getCheckRate } from "@/db/queries/check-rate";
import { listCorrections } from "@/db/queries/estimate-record";
import { getRatesAt } from "@/db/queries/rates";
import { getStripTableAt } from "@/db/queries/strip-table";
import { dayWords } from "@/lib/cases/moment-words";
import { checkCents, USUAL_CHECK_SECONDS } from "@/lib/costs/check-cost";
import { EMPTY_STRIP, typedFrom } from "@/lib/costs/strip-address";
import { stripAddress } from "@/lib/costs/strip-address.schema";
import { changeStack } from "@/lib/costs/strip-typing";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { chooseStripMethod } from "../../cases/actions";
import { loadOrigin } from "./load-origin";

export const metadata: Metadata = { title: "Strip estimate" };

interface StripPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const CHECK_DAYS = 91;
const DAY_MS = 24 * 60 * 60_000;

/** What it takes to take a deposit off: time, metal and money by every way, against doing it at the strike. */
export default async function StripPage({ searchParams }: StripPageProps) {
  const member = await guardPage("strip.estimate", routes.strip());
  const { timeZone, currency } = member.shop;
  const query = stripAddress.parse(await searchParams);
  const db = getDb();
  const now = Date.now();
  const { origin, fault, at } = loadOrigin(db, member, query, now);
  const rates = getRatesAt(db, member.shopId, at);
  const typed = typedFrom(query, origin?.own ?? EMPTY_STRIP);
  // `do` is a press beside the stack in a browser without script.
  const start = query.do ? changeStack(typed, query.do) : typed;
  const { actor, counts } = shellFor(member);
  const main = { label: "Put this on the case", form: STRIP_CHOICE_ID };
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="strip"
      main={origin?.canChoose ? main : null}
      thumb={
        origin?.canChoose ? undefined : (
          <ThumbBar back={null}>
            <PrintButton>Print the sheet</PrintButton>
          </ThumbBar>
        )
      }
    >
      <StripEstimator
        // Another batch to start from is another estimator: its fields begin anew. Putting a way on the case is not.
        key={JSON.stringify([origin?.key, { ...start, way: "" }])}
        start={start}
        origin={origin}
        originFault={fault}
        rates={rates}
        ratesWords={{ from: dayWords(rates.validFromAt, timeZone), source: rates.source, currency }}
        table={getStripTableAt(db, member.shopId, at)}
        corrections={listCorrections(db, member.shopId)}
        worth={checkFigures(db, member.shopId, rates.labourCentsPerHour, now)}
        shopName={actor.shopName}
        today={dayWords(now, timeZone)}
        chooseAction={chooseStripMethod}
      />
    </ShopShell>
  );
}

/** What the shop's last runs say about its checks. */
function checkFigures(db: Db, shopId: number, labourCentsPerHour: number, now: number) {
  const { inspected, bad, runs } = getCheckRate(db, shopId, { fromAt: now - CHECK_DAYS * DAY_MS, toAt: now });
  return {
    checkCents: checkCents(labourCentsPerHour),
    checkSeconds: USUAL_CHECK_SECONDS,
    checkFrom: "usual time, from memory",
    inspected,
    bad,
    runs,
    periodWords: `in the last ${CHECK_DAYS} days`,
  };
}
