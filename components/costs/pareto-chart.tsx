import type { ReactNode } from "react";
import { vitalFew, type LedgerRow } from "@/lib/costs/ledger-view";
import { wrapWords } from "@/lib/costs/wrap-words";
import { OTHER } from "@/lib/stats/pareto";

interface ParetoChartProps {
  rows: readonly LedgerRow[];
  money: (cents: number) => string;
  /** The cases behind a bar; null for the bar that gathers what is left over. */
  hrefFor: (row: LedgerRow) => string | null;
  label: string;
}

/** The few that cost most, first. Stands from 720 px up, lies on its side below. Every bar opens its cases. */
export function ParetoChart(props: ParetoChartProps) {
  return (
    <figure className="pareto">
      <StandingPareto {...props} />
      <LyingPareto {...props} />
    </figure>
  );
}

const WIDE = { width: 848, height: 452, left: 8, top: 34, foot: 96, bar: 84 };

function StandingPareto({ rows, money, hrefFor, label }: ParetoChartProps) {
  const { width, height, left, top, foot, bar } = WIDE;
  const room = height - top - foot;
  const total = rows.reduce((sum, row) => sum + row.cost, 0) || 1;
  const step = rows.length > 1 ? Math.min(180, (width - 2 * left - bar) / (rows.length - 1)) : 0;
  const few = vitalFew(rows);
  const bars = rows.map((row, index) => {
    const tall = Math.max(4, (room * row.cost) / total);
    const middle = left + index * step + bar / 2;
    return {
      row,
      middle,
      tall,
      y: top + room - tall,
      runningY: top + room * (1 - row.cumulative),
      isFew: index < few && row.key !== OTHER,
    };
  });
  const eighty = top + room * 0.2;
  return (
    <svg className="pareto__wide" viewBox={`0 0 ${width} ${height}`} role="group" aria-label={label}>
      <Hatch id="pareto-wide" />
      <path d={`M0 ${eighty}H${width}`} stroke="var(--edge)" strokeDasharray="2 5" />
      <text className="chart-quiet" x="0" y={eighty - 7}>
        80% of the money
      </text>
      {bars.map(({ row, middle, tall, y, isFew }, index) => (
        <ChartLink key={row.key} href={hrefFor(row)} label={barWords(row, money)}>
          <rect
            className="pareto__bar"
            x={middle - bar / 2}
            y={y}
            width={bar}
            height={tall}
            fill={barFill(isFew, "pareto-wide")}
          />
          <text
            className={index === 0 && tall > 44 ? "chart-figure chart-figure--on" : "chart-figure"}
            x={middle}
            y={index === 0 && tall > 44 ? y + 34 : y - 8}
            textAnchor="middle"
          >
            {money(row.cost)}
          </text>
          <BarName row={row} x={middle} y={top + room + 22} />
        </ChartLink>
      ))}
      <path d={`M0 ${top + room}H${width}`} stroke="var(--ink)" strokeWidth="2" />
      <path
        d={`M${bars.map((each) => `${each.middle} ${each.runningY}`).join("L")}`}
        fill="none"
        stroke="var(--blue)"
        strokeWidth="2.5"
      />
      {bars.map(({ row, middle, runningY }, index) => (
        <g key={row.key} aria-hidden="true">
          <circle cx={middle} cy={runningY} r="5" fill="var(--ground)" stroke="var(--blue)" strokeWidth="2.5" />
          {index > 0 && (
            <text className="chart-running" x={middle} y={runningY - 13} textAnchor="middle">
              {percent(row.cumulative)}
            </text>
          )}
        </g>
      ))}
    </svg>
  );
}

function BarName({ row, x, y }: { row: LedgerRow; x: number; y: number }) {
  const lines = wrapWords(row.label, 13, 3);
  return (
    <>
      {lines.map((line, index) => (
        <text key={line} className="chart-name" x={x} y={y + index * 18} textAnchor="middle">
          {line}
        </text>
      ))}
      <text className="chart-quiet" x={x} y={y + lines.length * 18} textAnchor="middle">
        {row.cases === 1 ? "1 case" : `${row.cases} cases`}
      </text>
    </>
  );
}

const NARROW = { width: 328, row: 60, longest: 176 };

function LyingPareto({ rows, money, hrefFor, label }: ParetoChartProps) {
  const { width, row: tall, longest } = NARROW;
  const most = Math.max(1, ...rows.map((row) => row.cost));
  const few = vitalFew(rows);
  return (
    <svg className="pareto__narrow" viewBox={`0 0 ${width} ${tall * rows.length}`} role="group" aria-label={label}>
      <Hatch id="pareto-narrow" />
      {rows.map((row, index) => {
        const y = index * tall;
        const long = Math.max(3, (longest * row.cost) / most);
        return (
          <ChartLink key={row.key} href={hrefFor(row)} label={barWords(row, money)}>
            {/* The whole row is pressed, not the sliver of a bar. */}
            <rect x="0" y={y} width={width} height={tall} fill="transparent" />
            <text className="chart-name" x="0" y={y + 16}>
              {wrapWords(row.label, 30, 1)[0]}
            </text>
            <text className="chart-quiet" x={width} y={y + 16} textAnchor="end">
              {row.cases === 1 ? "1 case" : `${row.cases} cases`}
            </text>
            <rect
              className="pareto__bar"
              x="0"
              y={y + 23}
              width={long}
              height="18"
              fill={barFill(index < few && row.key !== OTHER, "pareto-narrow")}
            />
            <text className="chart-figure" x={long + 8} y={y + 37.5}>
              {money(row.cost)}
            </text>
            <text className="chart-running" x={width} y={y + 37.5} textAnchor="end">
              {`to ${percent(row.cumulative)}`}
            </text>
          </ChartLink>
        );
      })}
    </svg>
  );
}

function ChartLink({ href, label, children }: { href: string | null; label: string; children: ReactNode }) {
  if (!href)
    return (
      <g role="img" aria-label={label}>
        {children}
      </g>
    );
  return (
    <a href={href} className="chart-link" aria-label={label}>
      {children}
    </a>
  );
}

function Hatch({ id }: { id: string }) {
  return (
    <defs>
      <pattern id={id} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width="6" height="6" fill="var(--sheet)" />
        <path d="M0 0V6" stroke="var(--ink)" strokeWidth="3" />
      </pattern>
    </defs>
  );
}

const barFill = (isFew: boolean, hatch: string) => (isFew ? "var(--ink)" : `url(#${hatch})`);
const percent = (share: number) => `${Math.round(share * 100)}%`;
const barWords = (row: LedgerRow, money: (cents: number) => string) =>
  `${row.label}: ${money(row.cost)}, ${row.cases === 1 ? "1 case" : `${row.cases} cases`}, running total ${percent(row.cumulative)}`;
