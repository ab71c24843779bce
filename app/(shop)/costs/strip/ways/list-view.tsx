import Link from "next/link";
import { EstimateRecord } from "@/components/costs/estimate-record";
import { StripWay } from "@/components/costs/strip-way";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Lead } from "@/components/ui/lead";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listCorrections } from "@/db/queries/estimate-record";
import { listClassCards } from "@/db/queries/library";
import { listStripHistory, type StripHistoryRow } from "@/db/queries/strip-table";
import { counted } from "@/lib/cases/part-words";
import { metalTitle } from "@/lib/costs/strip-words";
import type { StripRow } from "@/lib/costs/strip-methods";
import { DEPOSIT_METALS, type DepositMetal } from "@/lib/plating/metals";
import { routes } from "@/lib/routes";
import { shellFor } from "@/lib/server/shell-data";
import { mostOf, wayTitle, wayView } from "./way-view";

/** Every way to take a deposit off, by deposit; at the foot how the estimates that rest on them held up. */
export function ListView({ member }: { member: SignedIn }) {
  const db = getDb();
  const newest = newestRows(listStripHistory(db, member.shopId));
  const offered = newest.filter((way) => !way.retired).map((way) => way.row);
  const retired = newest.filter((way) => way.retired).map((way) => way.row);
  const classTitles = Object.fromEntries(listClassCards(db, member.shopId).map(({ slug, title }) => [slug, title]));
  const { currency } = member.shop;
  const { actor, counts } = shellFor(member);
  const main: MainAction = { label: "Add a way", href: routes.stripWays({ add: "1" }), keyCap: "N" };
  const views = offered.map((row) => wayView(row, 1, currency));
  const memory = views.filter((view) => view.isMemory).length;
  return (
    <ShopShell actor={actor} counts={counts} here="strip" back={routes.strip()} main={main}>
      <p className="lib-crumb">
        <Link href={routes.strip()}>Strip</Link>
      </p>
      <div className="rates-head">
        <Lead main={main}>
          {counted(offered.length, "way")} to take a deposit off. {memoryWords(memory, offered.length)}
        </Lead>
        <Rests>
          Every estimate is made from these. A bath is offered only on base metals that somebody vouches for. What you
          save holds for parts snapped from then on: a case keeps the table of its day.
        </Rests>
      </div>
      <div className="strip-ways">
        {groups(offered).map(({ title, rows, also }) => (
          <Section key={title} title={title} aside={rows.length > 0 ? counted(rows.length, "way") : undefined}>
            {rows.map((row) => (
              <StripWay key={row.id} way={wayView(row, mostOf(rows), currency)} />
            ))}
            {also.length > 0 && (
              <p className="small mid strip-ways__also">
                Also takes it off:{" "}
                {also.map((row, index) => (
                  <span key={row.id}>
                    {index > 0 && "; "}
                    <Link href={routes.stripWays({ way: row.id })}>{wayTitle(row)}</Link>
                  </span>
                ))}
              </p>
            )}
          </Section>
        ))}
        {retired.length > 0 && (
          <Section title="Retired" aside="Not offered">
            {retired.map((row) => (
              <StripWay key={row.id} way={wayView(row, mostOf([row]), currency)} />
            ))}
          </Section>
        )}
      </div>
      <Section title="Did the estimates hold" className="strip-ways__record">
        <EstimateRecord rows={listCorrections(db, member.shopId)} classTitles={classTitles} />
      </Section>
    </ShopShell>
  );
}

function memoryWords(memory: number, all: number): string {
  if (memory === 0) return "No rate rests on memory.";
  if (memory === all) return "All their rates rest on memory.";
  return memory === 1 ? "One rate rests on memory." : `${memory} of the rates rest on memory.`;
}

/** The newest row of each way, in the order in which baths are preferred. */
function newestRows(history: readonly StripHistoryRow[]): StripHistoryRow[] {
  const seen = new Map<string, StripHistoryRow>();
  for (const row of history) if (!seen.has(row.slug)) seen.set(row.slug, row);
  return [...seen.values()].toSorted((a, b) => a.position - b.position);
}

interface Group {
  title: string;
  rows: StripRow[];
  /** Ways that stand under another deposit and take this one off too. */
  also: StripRow[];
}

function groups(rows: readonly StripRow[]): Group[] {
  const takes = (row: StripRow): readonly DepositMetal[] => (row.method === "polish-back" ? [] : row.takesOff);
  const byMetal = DEPOSIT_METALS.flatMap((metal): Group[] => {
    const own = rows.filter((row) => takes(row)[0] === metal);
    const also = rows.filter((row) => takes(row).indexOf(metal) > 0);
    return own.length + also.length > 0 ? [{ title: metalTitle(metal), rows: own, also }] : [];
  });
  const polishing = rows.filter((row) => row.method === "polish-back");
  return [...byMetal, { title: "Any deposit", rows: polishing, also: [] }];
}
