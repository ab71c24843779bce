import type { PreviewLine, PreviewStage } from "@/lib/costs/rates-preview";
import { formatMoney } from "@/lib/money";

interface PreviewTableProps {
  head: string;
  thenHead: string;
  lines: readonly PreviewLine[];
  stage: PreviewStage;
  total: string;
  currency: string;
}

/** Lines of one stage under both rates, with the difference. Four narrow columns, on a phone too. */
export function PreviewTable({ head, thenHead, lines, stage, total, currency }: PreviewTableProps) {
  const money = (cents: number) => formatMoney(cents, currency);
  return (
    <table className="rates-what__table">
      <caption className="sr-only">{total}: what it costs now, at the new rates, and the difference</caption>
      <thead>
        <tr>
          <th scope="col">{head}</th>
          <th scope="col" className="n">
            Now
          </th>
          <th scope="col" className="n">
            {thenHead}
          </th>
          <th scope="col" className="n">
            More
          </th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr key={line.name}>
            <th scope="row">{line.name}</th>
            <td className="n">{money(line.nowCents)}</td>
            <td className="n">{money(line.thenCents)}</td>
            <More cents={line.thenCents - line.nowCents} currency={currency} />
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr>
          <th scope="row">{total}</th>
          <td className="n">{money(stage.now.meanCents)}</td>
          <td className="n">{money(stage.then.meanCents)}</td>
          <More cents={stage.then.meanCents - stage.now.meanCents} currency={currency} />
        </tr>
      </tfoot>
    </table>
  );
}

function More({ cents, currency }: { cents: number; currency: string }) {
  if (cents === 0) return <td className="n quiet">0</td>;
  return <td className="n rates-what__more">{formatMoney(cents, currency).replace("-", "−")}</td>;
}
