"use client";

import { useEffect, useState } from "react";
import { CopyAddress } from "@/components/costs/copy-address";
import { StripAnswer } from "@/components/costs/estimate-answer";
import { StripBatchFields } from "@/components/costs/estimate-batch-fields";
import type { StripEditing } from "@/components/costs/estimate-editing";
import { StripLayers } from "@/components/costs/estimate-layers";
import { StripResults } from "@/components/costs/estimate-results";
import type { ChooseStrip } from "@/components/costs/estimate-choice";
import type { WorthCheckProps } from "@/components/costs/worth-check";
import { Button } from "@/components/ui/button";
import { minutesCorrections, type CorrectionRow } from "@/lib/costs/estimate-record";
import { currencySign } from "@/lib/costs/rate-fields";
import type { ShopRates } from "@/lib/costs/rates";
import { readStrip, type StripReading } from "@/lib/costs/read-strip";
import { reckonStrip, type StripReckoning } from "@/lib/costs/reckon-strip";
import { EMPTY_STRIP, queryOf, type StripTyped } from "@/lib/costs/strip-address";
import type { RatesWords } from "@/lib/costs/strip-basis";
import type { StripTable } from "@/lib/costs/strip-plan";
import { routes } from "@/lib/routes";

export const STRIP_FORM_ID = "strip-form";
export const STRIP_CHOICE_ID = "strip-choice";

/** Where the fields were filled in from. */
export interface StripOrigin {
  kind: "case" | "job";
  /** The reference of the case, the row number of the job. */
  key: string;
  href: string;
  /** "CT-2606-0117, Bellwether" */
  words: string;
  customer: string;
  partName: string;
  jobNumber: string;
  /** What the case or the job itself says, to tell when the batch is another one. */
  own: StripTyped;
  /** Null: a job has no cause and no class. */
  classSlug: string | null;
  /** The case is open and this person may say how it comes off. */
  canChoose: boolean;
}

export interface StripEstimatorProps {
  start: StripTyped;
  /** Why `case` or `job` of the address filled nothing in. */
  originFault?: string;
  origin: StripOrigin | null;
  rates: ShopRates;
  ratesWords: RatesWords;
  table: StripTable;
  corrections: readonly CorrectionRow[];
  /** What the shop knows of its checks; what a miss costs is this batch's. */
  worth: Omit<WorthCheckProps, "missCents" | "missFrom" | "currency" | "headingLevel"> | null;
  shopName: string;
  /** "14 Jul 2026" */
  today: string;
  chooseAction: ChooseStrip;
}

interface Shown {
  typed: StripTyped;
  reading: StripReading;
  /** The last batch that could be reckoned; null before there was one. */
  reckoning: StripReckoning | null;
}

/** Waits this long after a key before the address is written: browsers allow only so many changes a second. */
const ADDRESS_AFTER_MS = 250;

/** The strip estimator: what is on the part, how much of it, and every way to take it off. Live, and a plain form without script. */
export function StripEstimator(props: StripEstimatorProps) {
  const { origin } = props;
  const shop = {
    rates: props.rates,
    table: props.table,
    corrections: minutesCorrections(props.corrections, origin?.classSlug ?? null),
  };
  const look = (typed: StripTyped, before: StripReckoning | null): Shown => {
    const reading = readStrip(typed);
    return { typed, reading, reckoning: reading.batch ? reckonStrip(reading.batch, shop) : before };
  };
  const [shown, setShown] = useState(() => look(props.start, null));
  const [isTouched, setIsTouched] = useState(false);
  const change = (typed: StripTyped) => {
    setShown((before) => look(typed, before.reckoning));
    setIsTouched(true);
  };
  const { typed, reading, reckoning } = shown;
  useAddress(isTouched ? routes.strip(queryOf(typed, keysOf(origin))) : null);
  const editing: StripEditing = { typed, faults: reading.faults, reading, onChange: change };
  return (
    <div className="est">
      <StripAnswer {...props} reckoning={reckoning} isWaiting={reading.batch === null} />
      <form
        id={STRIP_FORM_ID}
        className="est-build no-print"
        action={routes.strip()}
        method="get"
        onSubmit={(event) => event.preventDefault()}
      >
        {origin && <input type="hidden" name={origin.kind} value={origin.key} />}
        <input type="hidden" name="way" value={typed.way} />
        <StripLayers {...editing} weighed={reckoning?.layers ?? null} />
        <StripBatchFields
          {...editing}
          currencySign={currencySign(props.ratesWords.currency)}
          filledFrom={filledWords(origin, typed)}
        />
        <noscript>
          <Button type="submit" variant="plain">
            Work it out
          </Button>
        </noscript>
      </form>
      {reckoning && (
        <StripResults
          {...props}
          typed={typed}
          reckoning={reckoning}
          isWaiting={reading.batch === null}
          onPick={(way) => change({ ...typed, way })}
          share={<CopyAddress />}
        />
      )}
    </div>
  );
}

function keysOf(origin: StripOrigin | null): { case?: string; job?: string } {
  return origin ? { [origin.kind]: origin.key } : {};
}

const EMPTY = JSON.stringify(EMPTY_STRIP);

function filledWords(origin: StripOrigin | null, typed: StripTyped): string {
  if (origin?.kind === "case") return "Filled in from the case and its job. Thickness as ordered, not measured.";
  if (origin) return "Filled in from the job. Thickness as ordered, not measured.";
  if (JSON.stringify(typed) !== EMPTY) return "";
  return "To begin with: one steel part with the usual strike and 5 µm of nickel, to type over.";
}

/** Keeps the page's address in step with its fields, without a visit to the server. */
function useAddress(address: string | null): void {
  useEffect(() => {
    if (address === null) return;
    const timer = window.setTimeout(() => window.history.replaceState(null, "", address), ADDRESS_AFTER_MS);
    return () => window.clearTimeout(timer);
  }, [address]);
}
