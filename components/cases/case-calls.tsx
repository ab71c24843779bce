import { classGlyph } from "@/components/cases/class-glyph";
import { DataTable } from "@/components/ui/data-table";
import { Glyph } from "@/components/ui/glyph";
import { SURENESS, type Sureness } from "@/lib/cases/case-words";

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

/** What a reader should know of the caller: the round, whether it was the senior's second look, or a trainee's eye. */
function marks(call: CallRow, hasRounds: boolean): string {
  const part = call.kind === "second-look" ? "second look" : call.asTrainee ? "trainee" : "";
  return [hasRounds ? `round ${call.round}` : "", part].filter(Boolean).join(", ");
}

function Caller({ call, hasRounds }: { call: CallRow; hasRounds: boolean }) {
  const words = marks(call, hasRounds);
  return (
    <>
      {call.by}
      {words && <small className="step-who">{words}</small>}
    </>
  );
}

/** Who called what, and how sure they were. */
export function CallsTable({ calls, caption }: { calls: readonly CallRow[]; caption: string }) {
  const hasRounds = calls.some((call) => call.round > 1);
  return (
    <div className="keeps-table">
      <DataTable
        caption={caption}
        rows={calls}
        rowKey={(call) => String(call.id)}
        columns={[
          { key: "who", head: "Who", cell: (call) => <Caller call={call} hasRounds={hasRounds} /> },
          {
            key: "call",
            head: "Call",
            cell: (call) => (
              <span className="call-cell">
                <Glyph name={classGlyph(call.classSlug)} size={22} />
                {call.classTitle ?? "Can't tell"}
              </span>
            ),
          },
          {
            key: "sure",
            head: "Sure",
            numeric: true,
            cell: (call) => (call.classSlug === null ? "" : `${call.sure} of ${SURENESS.length}`),
          },
        ]}
      />
    </div>
  );
}
