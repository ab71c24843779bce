import { DataTable } from "@/components/ui/data-table";
import { Rests } from "@/components/ui/rests";
import { formatMoney } from "@/lib/money";

interface Figure {
  meanCents: number;
  low90Cents: number;
  high90Cents: number;
  lines: readonly { name: string; meanCents: number }[];
}

interface CaseMoneyProps {
  estimate: Figure | null;
  recorded: Figure | null;
  atRisk: { meanCents: number; low90Cents: number; high90Cents: number };
  currency: string;
  quantity: number;
  ratesFrom: string;
  assumed: readonly string[];
}

interface MoneyLine {
  name: string;
  estimate: number | null;
  recorded: number | null;
}

/** The lines of both figures under each other; a line that only one of them has stays. */
function linesOf(estimate: Figure | null, recorded: Figure | null): MoneyLine[] {
  const names = new Set([...(estimate?.lines ?? []), ...(recorded?.lines ?? [])].map((line) => line.name));
  const find = (figure: Figure | null, name: string) =>
    figure?.lines.find((line) => line.name === name)?.meanCents ?? null;
  return [...names].map((name) => ({ name, estimate: find(estimate, name), recorded: find(recorded, name) }));
}

/** What the case costs, estimated and recorded. Only for those who may see money. */
export function CaseMoneyTable(props: CaseMoneyProps) {
  const { estimate, recorded, atRisk, currency, quantity, ratesFrom, assumed } = props;
  const money = (cents: number | null) => (cents === null ? "" : formatMoney(cents, currency));
  const range = (figure: { low90Cents: number; high90Cents: number }) =>
    `${formatMoney(figure.low90Cents, currency, { whole: true })} to ${formatMoney(figure.high90Cents, currency, { whole: true })}`;
  return (
    <div className="keeps-table">
      <DataTable
        caption="Cost of the case"
        rows={linesOf(estimate, recorded)}
        rowKey={(line) => line.name}
        columns={[
          { key: "name", head: "Line", cell: (line) => line.name },
          { key: "estimate", head: "Estimate", numeric: true, cell: (line) => money(line.estimate) },
          ...(recorded
            ? [{ key: "recorded", head: "Recorded", numeric: true, cell: (line: MoneyLine) => money(line.recorded) }]
            : []),
        ]}
        foot={[
          quantity === 1 ? "The part" : `All ${quantity} parts`,
          money(estimate?.meanCents ?? null),
          ...(recorded ? [money(recorded.meanCents)] : []),
        ]}
      />
      <Rests>
        Rates of {ratesFrom}. {estimate && `Estimate ${range(estimate)}, 90% range. `}
        Had it gone on and failed later: {range(atRisk)}. {assumed.join(" ")}
      </Rests>
    </div>
  );
}
