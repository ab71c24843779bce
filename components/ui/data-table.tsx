/* The phone layout takes the table display away, and with it the semantics: hence the roles spelled out. */
/* eslint-disable jsx-a11y/no-redundant-roles, jsx-a11y/no-interactive-element-to-noninteractive-role */
import Link from "next/link";
import { Fragment } from "react";
import type { ReactNode } from "react";

export interface Column<Row> {
  key: string;
  head: string;
  cell: (row: Row) => ReactNode;
  /** Figures: right-aligned, figure face. */
  numeric?: boolean;
  /** The head becomes a link that sorts. */
  sortHref?: string;
  sorted?: "ascending" | "descending";
  /** Left out on a phone. */
  wideOnly?: boolean;
}

export interface DataTableProps<Row> {
  /** Says what the table holds; for readers unless `showCaption`. */
  caption: string;
  showCaption?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** A line across the table under a row that has something to say. */
  rowNote?: (row: Row) => ReactNode;
  /** Cells of a last line, one a column; null leaves a cell empty. */
  foot?: readonly ReactNode[];
}

function cellClass<Row>(column: Column<Row>): string | undefined {
  return [column.numeric && "n", column.wideOnly && "wide-only"].filter(Boolean).join(" ") || undefined;
}

function Head<Row>({ column }: { column: Column<Row> }) {
  return (
    <th scope="col" role="columnheader" className={cellClass(column)} aria-sort={column.sorted}>
      {column.sortHref ? (
        <Link href={column.sortHref} scroll={false}>
          {column.head}
        </Link>
      ) : (
        column.head
      )}
    </th>
  );
}

function NoteLine({ note, span }: { note: ReactNode; span: number }) {
  if (!note) return null;
  return (
    <tr role="row" className="tb__note">
      <td role="cell" colSpan={span}>
        {note}
      </td>
    </tr>
  );
}

/** A plain table. On a phone each row turns into lines of head and value, so nothing scrolls sideways. */
export function DataTable<Row>({ caption, showCaption, columns, rows, rowKey, rowNote, foot }: DataTableProps<Row>) {
  return (
    <table className="tb" role="table">
      <caption className={showCaption ? undefined : "sr-only"}>{caption}</caption>
      <thead role="rowgroup">
        <tr role="row">
          {columns.map((column) => (
            <Head key={column.key} column={column} />
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row) => (
          <Fragment key={rowKey(row)}>
            <tr role="row">
              {columns.map((column) => (
                <td role="cell" key={column.key} className={cellClass(column)} data-head={column.head}>
                  <span>{column.cell(row)}</span>
                </td>
              ))}
            </tr>
            <NoteLine note={rowNote?.(row)} span={columns.length} />
          </Fragment>
        ))}
      </tbody>
      {foot && (
        <tfoot role="rowgroup">
          <tr role="row">
            {columns.map((column, index) => (
              <td role="cell" key={column.key} className={cellClass(column)} data-head={column.head}>
                <span>{foot[index]}</span>
              </td>
            ))}
          </tr>
        </tfoot>
      )}
    </table>
  );
}
