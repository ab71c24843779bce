"use client";

import { useState } from "react";
import { WorthCheck } from "@/components/costs/worth-check";
import { Field } from "@/components/ui/field";
import { CHECK_LIMITS, checkCents, USUAL_CHECK_SECONDS, USUAL_TAPE_CENTS } from "@/lib/costs/check-cost";
import { amountWords } from "@/lib/costs/worth-words";
import { NOT_A_NUMBER, readDecimal } from "@/lib/decimal";

export interface WorthTryProps {
  labourCentsPerHour: number;
  missCents: number;
  missFrom: string;
  inspected: number;
  bad: number;
  runs: number;
  periodWords: string;
  currency: string;
}

const MOST_SECONDS = CHECK_LIMITS.seconds.toLocaleString("en-US");

/** The answer for the shop, with the seconds of one look to try out. A bad figure leaves the last good answer standing. */
export function WorthTry({ labourCentsPerHour, ...figures }: WorthTryProps) {
  const [typed, setTyped] = useState(String(USUAL_CHECK_SECONDS));
  const [seconds, setSeconds] = useState(USUAL_CHECK_SECONDS);
  const fault = faultOf(typed);
  const tape = amountWords(USUAL_TAPE_CENTS, figures.currency);
  return (
    <div className="stack">
      <WorthCheck
        {...figures}
        checkSeconds={seconds}
        checkCents={checkCents(labourCentsPerHour, seconds)}
        checkFrom={`labour at the shop’s rate and ${tape} of tape; tape${seconds === USUAL_CHECK_SECONDS ? " and seconds" : ""} from memory`}
      />
      <Field
        className="worth__seconds"
        label="Looking at one part takes"
        name="checkSeconds"
        unit="s"
        inputMode="decimal"
        value={typed}
        error={fault}
        hint={`${USUAL_CHECK_SECONDS} s is from memory. Clock ten parts and write the mean.`}
        onChange={({ target }) => {
          setTyped(target.value);
          const figure = readDecimal(target.value.trim());
          if (figure !== undefined && !faultOf(target.value)) setSeconds(figure);
        }}
      />
    </div>
  );
}

function faultOf(typed: string): string | undefined {
  const figure = readDecimal(typed.trim());
  if (figure === undefined) return NOT_A_NUMBER;
  return figure > 0 && figure <= CHECK_LIMITS.seconds ? undefined : `Write seconds above 0, at most ${MOST_SECONDS}.`;
}
