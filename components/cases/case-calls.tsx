import { classGlyph } from "@/components/cases/class-glyph";
import { DataTable } from "@/components/ui/data-table";
import { Glyph } from "@/components/ui/glyph";
import { SURENESS_TITLES, type Sureness } from "@/lib/cases/case-words";

export interface CallRow {
  id: number;
  round: number;
  kind: "first" | "further" | "second-look";
  by: string;
  asTrainee: boolean;
  classSlug: string | null;
  classTitle: string | null;
  sure: Sureness;
}

function who(call: CallRow): string {
  const mark = call.kind === "second-look" ? ", second look" : call.asTrainee ? ", trainee" : "";
  return `${call.by}${mark}`;
}

/** Who called what, and how sure they were. */
export function CallsTable({ calls, caption }: { calls: readonly CallRow[]; caption: string }) {
  const hasRounds = calls.some((call) => call.round > 1);
  return (
    <DataTable
      caption={caption}
      rows={calls}
      rowKey={(call) => String(call.id)}
      columns={[
        ...(hasRounds ? [{ key: "round", head: "Round", cell: (call: CallRow) => call.round }] : []),
        { key: "who", head: "Who", cell: who },
        {
          key: "call",
          head: "Call",
          cell: (call: CallRow) => (
            <span className="call-cell">
              <Glyph name={classGlyph(call.classSlug)} size={22} />
              {call.classTitle ?? "Can't tell"}
            </span>
          ),
        },
        {
          key: "sure",
          head: "How sure",
          numeric: true,
          cell: (call: CallRow) => (call.classSlug === null ? "" : SURENESS_TITLES[call.sure]),
        },
      ]}
    />
  );
}
