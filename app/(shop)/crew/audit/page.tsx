import type { Metadata } from "next";
import { ShopShell } from "@/components/shell/shop-shell";
import { DataTable, type Column } from "@/components/ui/data-table";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Pager } from "@/components/ui/pager";
import { getDb } from "@/db/client";
import { listAudit, type AuditEntry } from "@/db/queries/audit";
import { auditDetail, auditSentence } from "@/lib/crew/audit-words";
import { clockWords } from "@/lib/crew/clock-words";
import { pageBefore } from "@/lib/crew/page-before";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";

export const metadata: Metadata = { title: "Who changed what" };

const PAGE_ENTRIES = 50;

const columnsIn = (timeZone: string): Column<AuditEntry>[] => [
  { key: "at", head: "When", cell: (entry) => clockWords(entry.at, timeZone) },
  {
    key: "what",
    head: "What",
    cell: (entry) => (
      <span className="wrap-anywhere">
        <strong>{entry.memberName ?? "Coppertell"}</strong> {auditSentence(entry)}
      </span>
    ),
  },
  {
    key: "detail",
    head: "Detail",
    cell: (entry) => <span className="wrap-anywhere">{auditDetail(entry.detail)}</span>,
  },
];

export default async function AuditPage({ searchParams }: { searchParams: Promise<{ before?: string | string[] }> }) {
  const member = await guardPage("audit.see", routes.audit());
  const { actor, counts } = shellFor(member);
  const beforeId = pageBefore((await searchParams).before);
  const { entries, nextBeforeId } = listAudit(getDb(), member.shopId, { beforeId, limit: PAGE_ENTRIES });
  return (
    <ShopShell actor={actor} counts={counts} here="crew" back={routes.crew()}>
      <Lead
        size="page"
        below="People, roles, passwords, rates and the library. Nothing here is ever changed or deleted."
      >
        Who changed what
      </Lead>
      {entries.length === 0 ? (
        <Empty level={2} title="Nothing yet">
          The first change to people or roles shows here.
        </Empty>
      ) : (
        <DataTable
          caption="Changes, newest first"
          columns={columnsIn(member.shop.timeZone)}
          rows={entries}
          rowKey={(entry) => String(entry.id)}
        />
      )}
      <Pager
        words={`${entries.length} shown, newest first`}
        nextHref={nextBeforeId === null ? null : `${routes.audit()}?before=${nextBeforeId}`}
        nextWords="Show older ones"
        previousHref={beforeId === undefined ? null : routes.audit()}
        previousWords="Back to the newest"
      />
    </ShopShell>
  );
}
