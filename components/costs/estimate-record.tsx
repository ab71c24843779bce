import { DataTable } from "@/components/ui/data-table";
import { Empty } from "@/components/ui/empty";
import { Rests } from "@/components/ui/rests";
import { LEAST_PAIRS } from "@/lib/costs/correction";
import type { CorrectionRow } from "@/lib/costs/estimate-record";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";

export interface EstimateRecordProps {
  rows: readonly CorrectionRow[];
  /** Title of each class by its slug; one that is missing is shown by its slug. */
  classTitles: Readonly<Record<string, string>>;
}

/** How real rework compared to its estimate, by method and class, and what later estimates are multiplied by. */
export function EstimateRecord({ rows, classTitles }: EstimateRecordProps) {
  if (rows.length === 0) {
    return (
      <Empty title="No rework is closed yet">
        Once rework cards are done, their minutes stand here beside the estimate, and correct the next ones.
      </Empty>
    );
  }
  const titleOf = ({ classSlug }: CorrectionRow) =>
    classSlug === null ? "All classes" : (classTitles[classSlug] ?? classSlug);
  return (
    <>
      <DataTable
        caption="Hands-on minutes of closed cases: estimated against recorded"
        columns={[
          {
            key: "class",
            head: "Class",
            cell: (row) => (row.classSlug === null ? <b>{titleOf(row)}</b> : titleOf(row)),
          },
          { key: "method", head: "Way", cell: (row) => STRIP_METHOD_TITLES[row.method] },
          { key: "pairs", head: "Cases", numeric: true, cell: (row) => row.pairs },
          { key: "estimated", head: "Estimated", numeric: true, cell: (row) => eachWords(row.estimatedMinutes, row) },
          { key: "recorded", head: "Recorded", numeric: true, cell: (row) => eachWords(row.recordedMinutes, row) },
          { key: "ratio", head: "Corrects by", numeric: true, cell: ratioWords },
        ]}
        rows={rows}
        rowKey={(row) => `${row.method}-${row.classSlug ?? ""}`}
      />
      <Rests>
        Hands-on minutes a case, mean of the newest closed cases. From {LEAST_PAIRS} cases on, estimates of that class
        and way are multiplied by recorded over estimated, drawn towards 1; with fewer, by the ratio of the way over all
        classes.
      </Rests>
    </>
  );
}

function eachWords(minutes: number, { pairs }: CorrectionRow): string {
  return `${Math.round(minutes / pairs)} min`;
}

/** "× 1.12", or how many there are of those that it takes. */
function ratioWords({ correction }: CorrectionRow): string {
  if (!correction.enough) return `${correction.have} of ${correction.need}`;
  return `× ${correction.ratio.toFixed(2)}`;
}
