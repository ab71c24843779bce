import Link from "next/link";
import { DataTable } from "@/components/ui/data-table";
import { Empty } from "@/components/ui/empty";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listCostBy } from "@/db/queries/ledger";
import { ledgerRows } from "@/lib/costs/ledger-view";
import { lastSpan, SPAN_WORDS } from "@/lib/costs/period";
import { formatMoney } from "@/lib/money";
import { routes } from "@/lib/routes";

const SHOWN = 3;

/** The owner's first look: what rework cost lately and what it came from. */
export function MoneyThisMonth({ member, now }: { member: SignedIn; now: number }) {
  const period = lastSpan("month", now, member.shop.timeZone);
  const amounts = listCostBy(getDb(), member.shopId, "cause", { fromAt: period.fromAt, untilAt: period.untilAt });
  const { rows, totalCents } = ledgerRows(amounts);
  const money = (cents: number) => formatMoney(cents, member.shop.currency, { whole: true });
  const cases = rows.reduce((sum, row) => sum + row.cases, 0);
  const link = (key: string, label: string) => (
    <Link
      className="solo"
      href={routes.casebook({ cause: key, status: "closed", closedFrom: period.from, closedTo: period.to })}
    >
      {label}
    </Link>
  );
  return (
    <Section
      title={`${money(totalCents)} went into rework in ${SPAN_WORDS.month}`}
      aside={<Link href={routes.ledger()}>Ledger</Link>}
      rests={`${cases} closed cases.`}
    >
      {rows.length === 0 ? (
        <Empty title="Nothing was reworked.">No case was closed in the last {SPAN_WORDS.month}.</Empty>
      ) : (
        <DataTable
          caption="The causes that cost most"
          columns={[
            { key: "cause", head: "Cause", cell: (row) => (row.key ? link(row.key, row.label) : row.label) },
            { key: "cases", head: "Cases", numeric: true, cell: (row) => row.cases },
            { key: "cost", head: "Cost", numeric: true, cell: (row) => money(row.cost) },
          ]}
          rows={rows.slice(0, SHOWN)}
          rowKey={(row) => row.key}
        />
      )}
    </Section>
  );
}
