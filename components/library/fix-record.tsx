import Link from "next/link";
import { OUTCOME_TITLES } from "@/lib/cases/case-words";
import { counted } from "@/lib/cases/part-words";
import { minutesWords } from "@/lib/library/evidence-words";
import type { FixRecord } from "@/lib/library/fix-record";
import { routes } from "@/lib/routes";

/** Tries drawn and listed, the newest first. */
const SHOWN = 16;

/** Behind a fix's "worked 7 of 9": each try, the minutes, and the cases. */
export function FixRecordView({ record }: { record: FixRecord }) {
  const { tries, range } = record;
  if (tries.length === 0) return <p className="small mid">Not tried here against this class yet.</p>;
  const shown = tries.slice(0, SHOWN);
  const minutes = minutesWords(record);
  return (
    <div className="fix-record">
      <p className="coupons" aria-hidden="true">
        {shown.map(({ ref, round, outcome }) => (
          <i key={`${ref} ${round}`} className={outcome === "sound" ? "is-sound" : "is-not"} />
        ))}
      </p>
      {!range.enough && (
        <p className="small mid">
          Not enough tries for a share yet: {range.have} of {range.need}
        </p>
      )}
      {minutes && <p className="small">{minutes}</p>}
      <details className="fold">
        <summary>
          {tries.length > SHOWN
            ? `Open the last ${SHOWN} of ${tries.length} tries`
            : `Open ${counted(tries.length, "try").replace(/trys$/, "tries")}`}
        </summary>
        <ul className="fix-tries">
          {shown.map(({ ref, round, outcome }) => (
            <li key={`${ref} ${round}`} className="small">
              <Link className="ref" href={routes.case(ref)} prefetch={false}>
                {ref}
              </Link>{" "}
              {OUTCOME_TITLES[outcome].toLowerCase()}
              {round > 1 && `, round ${round}`}
            </li>
          ))}
        </ul>
      </details>
      <p className="rests">Rework cards of this class with a re-strike that was looked at. Range: 95 %, by Wilson.</p>
    </div>
  );
}
