import { DataTable } from "@/components/ui/data-table";
import type { ClassTrend, TrendMonth } from "@/lib/library/class-trend";
import { rateWords, trendWords } from "@/lib/library/evidence-words";

interface TrendProps {
  trend: ClassTrend;
  /** The cases of a month. */
  hrefFor: (month: TrendMonth) => string;
}

const STEP = 44;
const BAR = 26;
const HIGH = 72;
const TOP = 28;

/** How often the class came up, month by month: a sentence, a small drawing, and the figures in a table behind it. */
export function TrendRow({ trend, hrefFor }: TrendProps) {
  const rate = rateWords(trend);
  return (
    <>
      <div className="trend">
        <div className="trend__say">
          <p>{trendWords(trend)}</p>
          {rate && <p className="trend__rate">{rate}</p>}
        </div>
        {trend.cases > 0 && <TrendDrawing trend={trend} hrefFor={hrefFor} />}
      </div>
      {trend.cases > 0 && (
        <details className="fold">
          <summary>Month by month</summary>
          <TrendTable trend={trend} hrefFor={hrefFor} />
        </details>
      )}
    </>
  );
}

function TrendDrawing({ trend: { months }, hrefFor }: TrendProps) {
  const most = Math.max(...months.map((month) => month.cases), 1);
  const foot = TOP + HIGH;
  return (
    <svg viewBox={`0 0 ${months.length * STEP} ${foot + 22}`} role="group" aria-label="Cases a month">
      <path className="trend__base" d={`M0 ${foot}H${months.length * STEP}`} />
      {months.map((month, index) => {
        const middle = index * STEP + STEP / 2;
        const high = (HIGH * month.cases) / most;
        const isLast = index === months.length - 1;
        return (
          <g key={month.from}>
            {month.cases > 0 && (
              <a href={hrefFor(month)} aria-label={`${month.long}: ${month.cases}`}>
                <rect x={index * STEP} y={0} width={STEP} height={foot} fill="transparent" />
                <rect
                  className={isLast ? "trend__now" : "trend__bar"}
                  x={middle - BAR / 2}
                  y={foot - high}
                  width={BAR}
                  height={high}
                />
                <text className="trend__count" x={middle} y={foot - high - 6}>
                  {month.cases}
                </text>
              </a>
            )}
            {!month.isRecorded && (
              <path className="trend__none" d={`M${middle - BAR / 2} ${foot - 6}H${middle + BAR / 2}`} />
            )}
            <text x={middle} y={foot + 17} aria-hidden="true">
              {month.short}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

function TrendTable({ trend, hrefFor }: TrendProps) {
  return (
    <DataTable
      caption="Cases a month"
      rows={trend.months.toReversed()}
      rowKey={(month) => month.from}
      columns={[
        { key: "month", head: "Month", cell: (month) => month.long },
        {
          key: "cases",
          head: "Cases",
          numeric: true,
          cell: (month) =>
            month.cases > 0 ? (
              <a className="solo" href={hrefFor(month)} aria-label={`${month.cases} in ${month.long}`}>
                {month.cases}
              </a>
            ) : month.isRecorded ? (
              "0"
            ) : (
              "No record"
            ),
        },
        { key: "parts", head: "Parts struck", numeric: true, cell: (month) => month.partsStruck || "No run logged" },
      ]}
    />
  );
}
