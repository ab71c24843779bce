import Link from "next/link";
import { DataTable } from "@/components/ui/data-table";
import { LEDGER_GROUP_TITLES, type LedgerGroup } from "@/lib/costs/ledger.schema";
import type { LedgerRow } from "@/lib/costs/ledger-view";

interface LedgerTableProps {
  rows: LedgerRow[];
  by: LedgerGroup;
  money: (cents: number) => string;
  totalCents: number;
  hrefFor: (row: LedgerRow) => string | null;
}

/** The picture as figures, for reading off and for readers. */
export function LedgerTable({ rows, by, money, totalCents, hrefFor }: LedgerTableProps) {
  return (
    <details className="ledger-table">
      <summary>The same as a table</summary>
      <DataTable
        caption={`Rework cost by ${LEDGER_GROUP_TITLES[by].toLowerCase()}`}
        columns={[
          {
            key: "label",
            head: LEDGER_GROUP_TITLES[by],
            cell: (row) => <CasesLink href={hrefFor(row)}>{row.label}</CasesLink>,
          },
          { key: "cases", head: "Cases", numeric: true, cell: (row) => row.cases },
          { key: "parts", head: "Parts", numeric: true, cell: (row) => row.parts },
          { key: "cost", head: "Cost", numeric: true, cell: (row) => money(row.cost) },
          { key: "share", head: "Share", numeric: true, cell: (row) => `${Math.round(row.share * 100)}%` },
        ]}
        rows={rows}
        rowKey={(row) => row.key}
        foot={[
          "All",
          rows.reduce((sum, row) => sum + row.cases, 0),
          rows.reduce((sum, row) => sum + row.parts, 0),
          money(totalCents),
          totalCents > 0 ? "100%" : "0%",
        ]}
      />
    </details>
  );
}

function CasesLink({ href, children }: { href: string | null; children: string }) {
  return href ? (
    <Link className="solo" href={href}>
      {children}
    </Link>
  ) : (
    children
  );
}
