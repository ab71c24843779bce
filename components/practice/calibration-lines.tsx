import { Range } from "@/components/ui/range";
import { SURENESS_TITLES } from "@/lib/cases/case-words";
import { LEAST_CALLS, notchWords, type NotchRecord } from "@/lib/practice/progress";

const percent = (share: number) => `${Math.round(share * 100)}%`;

/** How sure against how right: a line a notch, with the share right, its interval, and a dot where the notch promises to be. */
export function CalibrationLines({ notches }: { notches: readonly NotchRecord[] }) {
  return (
    <ul className="calibration">
      {notches.map((notch) => (
        <li key={notch.sure}>
          <p>
            <b>{SURENESS_TITLES[notch.sure]}</b>
            <span className="small mid">{notch.calls > 0 && `${notch.right} of ${notch.calls} right`}</span>
            <span className="small">{notchWords(notch)}</span>
          </p>
          {notch.calls >= LEAST_CALLS && (
            <Range
              low={notch.interval.low}
              likely={notch.right / notch.calls}
              high={notch.interval.high}
              min={0}
              max={1}
              words={{
                low: percent(notch.interval.low),
                likely: percent(notch.right / notch.calls),
                high: percent(notch.interval.high),
              }}
              mark={{
                at: notch.stated,
                words: `promises ${percent(notch.stated)}, kept ${percent(notch.right / notch.calls)}`,
              }}
            />
          )}
        </li>
      ))}
    </ul>
  );
}
