"use client";

import { useEffect, useMemo, useState } from "react";
import type { BaseMetal } from "@/lib/cases/case-words";
import { checkAddress } from "@/lib/metals/check-address";
import { declaredFit } from "@/lib/metals/declared";
import { readPart } from "@/lib/metals/part-reading";
import {
  readTypedCheck,
  startingCheck,
  type CheckFaults,
  type CheckField,
  type ShopUnits,
  type TypedCheck,
} from "@/lib/metals/typed-check";
import { routes } from "@/lib/routes";

/** A job as the check shows it. */
export interface JobToCheck {
  id: number;
  number: string;
  customer: string;
  partName: string;
  quantity: number;
  baseMetal: BaseMetal;
  alloy: string | null;
  /** The newest weighing of it, in words. */
  last: string | null;
}

export interface CheckStart {
  typed: TypedCheck;
  /** Somebody has typed a weight, so what is missing may be said. */
  isAsked: boolean;
  job: string | null;
  caseRef: string | null;
}

/** Between the last key and the address following it. */
const ADDRESS_DELAY_MS = 400;

/** What is typed, and what it says, at each key pressed. The address follows, to reload and to share. */
export function usePartCheck(start: CheckStart, jobs: readonly JobToCheck[], units: ShopUnits) {
  const [typed, setTyped] = useState(start.typed);
  const [jobNumber, setJobNumber] = useState(start.job);
  const [caseRef, setCaseRef] = useState(start.caseRef);
  const [left, setLeft] = useState<readonly CheckField[]>([]);
  const [isAsked, setIsAsked] = useState(start.isAsked);
  /** Something changed since the last answer of the server, which therefore speaks of other weights. */
  const [isChanged, setIsChanged] = useState(false);

  const address = addressOf(typed, jobNumber, caseRef);
  const given = addressOf(start.typed, start.job, start.caseRef);
  const [lastGiven, setLastGiven] = useState(given);
  if (given !== lastGiven) {
    setLastGiven(given);
    // Somebody followed a link to another check. An answer of the server comes with the address that stands already.
    if (given !== address) {
      setTyped(start.typed);
      setJobNumber(start.job);
      setCaseRef(start.caseRef);
      setLeft([]);
      setIsAsked(start.isAsked);
      setIsChanged(true);
    }
  }

  const read = useMemo(() => readTypedCheck(typed, units), [typed, units]);
  const reading = useMemo(() => (read.kind === "ready" ? readPart(read.input) : null), [read]);
  const job = jobs.find((each) => each.number === jobNumber) ?? null;
  const declared = reading && job ? declaredFit(reading.measured, job.baseMetal, job.alloy) : null;

  useEffect(() => {
    if (!isChanged) return;
    const timer = setTimeout(() => follow(address), ADDRESS_DELAY_MS);
    return () => clearTimeout(timer);
  }, [isChanged, address]);

  return {
    typed,
    job,
    caseRef,
    read,
    reading,
    declared,
    isChanged,
    faults: saidFaults(read.kind === "ready" ? {} : read.faults, typed, left, isAsked),
    type: (field: CheckField, value: string) => {
      setTyped((before) => ({ ...before, [field]: value }));
      setIsChanged(true);
    },
    leave: (field: CheckField) => setLeft((before) => (before.includes(field) ? before : [...before, field])),
    chooseJob: (number: string) => {
      if (number !== jobNumber) setCaseRef(null);
      setJobNumber(number || null);
      setIsChanged(true);
    },
    ask: () => setIsAsked(true),
    sent: () => {
      follow(address);
      setIsChanged(false);
    },
    /** The next part of the same job: its weights are still to come, the water and the balance are the same. */
    weighAnother: () => {
      setTyped((before) => ({ ...startingCheck(units), temp: before.temp, error: before.error }));
      setLeft([]);
      setIsAsked(false);
      setIsChanged(true);
    },
  };
}

const addressOf = (typed: TypedCheck, job: string | null, caseRef: string | null) =>
  routes.partCheck(checkAddress(typed, { job, case: caseRef }));

const follow = (address: string) => window.history.replaceState(null, "", address);

export type PartCheckState = ReturnType<typeof usePartCheck>;

/**
 * The faults to say now: all of them once somebody asked what fits; before that only of fields that were filled in and
 * left, so that no field scolds while it is being typed into.
 */
function saidFaults(
  faults: CheckFaults,
  typed: TypedCheck,
  left: readonly CheckField[],
  isAsked: boolean,
): CheckFaults {
  if (isAsked) return faults;
  const said = Object.entries(faults).filter(([name]) => left.some((field) => field === name && typed[field] !== ""));
  return Object.fromEntries(said);
}
