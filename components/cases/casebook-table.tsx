import Link from "next/link";
import { BesideBox } from "@/components/cases/beside-picks";
import { CasebookThumbs } from "@/components/cases/casebook-photos";
import { classGlyph } from "@/components/cases/class-glyph";
import { Marked } from "@/components/cases/casebook-marked";
import { StateMark } from "@/components/cases/state-mark";
import { DataTable, type Column } from "@/components/ui/data-table";
import { Glyph } from "@/components/ui/glyph";
import type { CasebookItem } from "@/lib/cases/casebook-item";
import type { SearchTerm } from "@/lib/cases/search-query";
import { routes } from "@/lib/routes";

interface CasebookTableProps {
  items: readonly CasebookItem[];
  terms: readonly SearchTerm[];
  /** The time by which the list stands, and the list the other way round. */
  time: { column: "opened" | "closed"; sorted: "ascending" | "descending" | undefined; turnHref: string };
  withMoney: boolean;
}

/** The casebook as a table: sorted by time only, the one order that stays quick however many cases there are. */
export function CasebookTable({ items, terms, time, withMoney }: CasebookTableProps) {
  const cost: Column<CasebookItem> = { key: "cost", head: "Cost", numeric: true, cell: (item) => item.cost };
  const columns: Column<CasebookItem>[] = [
    { key: "pick", head: "Set beside", cell: (item) => <BesideBox caseRef={item.ref} hideWords /> },
    { key: "photos", head: "Before, after", wideOnly: true, cell: (item) => <CasebookThumbs item={item} /> },
    {
      key: "ref",
      head: "Case",
      cell: (item) => (
        <Link className="ref" href={routes.case(item.ref)} prefetch={false}>
          {item.ref}
        </Link>
      ),
    },
    { key: "class", head: "Class", cell: (item) => <ClassCell item={item} terms={terms} /> },
    { key: "cause", head: "Cause", cell: (item) => <Marked text={item.causeTitle ?? ""} terms={terms} /> },
    { key: "parts", head: "Parts", cell: (item) => <PartsCell item={item} terms={terms} /> },
    { key: "round", head: "Rounds", numeric: true, wideOnly: true, cell: (item) => item.round },
    { key: "minutes", head: "Minutes", numeric: true, cell: (item) => item.spentMinutes },
    ...(withMoney ? [cost] : []),
    {
      key: "time",
      head: time.column === "closed" ? "Closed" : "Opened",
      cell: (item) => <span className="cb-day">{time.column === "closed" ? item.closed : item.opened}</span>,
      sortHref: time.turnHref,
      sorted: time.sorted,
    },
    { key: "state", head: "Stands", cell: (item) => <StateMark state={item.state} words={item.stateWords} /> },
  ];
  return (
    <div className="cb-table">
      <DataTable caption="Cases" columns={columns} rows={items} rowKey={(item) => item.ref} />
    </div>
  );
}

interface CellProps {
  item: CasebookItem;
  terms: readonly SearchTerm[];
}

function ClassCell({ item, terms }: CellProps) {
  return (
    <span className="cb-class">
      <Glyph name={classGlyph(item.classSlug)} />
      <span>
        <Marked text={item.classWords} terms={terms} />
      </span>
    </span>
  );
}

function PartsCell({ item, terms }: CellProps) {
  return (
    <>
      <Marked text={item.partsWords} terms={terms} />
      {item.foundBy && (
        <span className="cb-found">
          {item.foundBy.place}: <Marked text={item.foundBy.text} terms={terms} />
        </span>
      )}
    </>
  );
}
