"use client";

import { useState } from "react";
import { Field } from "@/components/ui/field";
import { Rests } from "@/components/ui/rests";
import { currencySign } from "@/lib/costs/rate-fields";
import { readTestPieces, type TestPieceField, type TypedTestPieces } from "@/lib/costs/test-piece-words";

export interface TestPiecesProps {
  /** What stands in the fields to begin with: percents and money as they are typed. */
  start: TypedTestPieces;
  currency: string;
  /** Where the figures to begin with come from. */
  rests: string;
}

/** A test piece first: how many pieces show a fault, and whether they pay. Reckons as it is typed; nothing is sent. */
export function TestPieces({ start, currency, rests }: TestPiecesProps) {
  const [typed, setTyped] = useState(start);
  const reading = readTestPieces(typed, currency);
  const faults = reading.ok ? {} : reading.faults;
  const sign = currencySign(currency);
  const field = (name: TestPieceField, label: string, unit: string) => (
    <Field
      label={label}
      name={name}
      unit={unit}
      inputMode="decimal"
      value={typed[name]}
      onChange={(event) => setTyped({ ...typed, [name]: event.target.value })}
      error={faults[name]}
    />
  );
  return (
    <div className="test-pieces">
      <div className="test-pieces__fields">
        {field("badPercent", "Parts that the fault spoils", "%")}
        {field("wantedPercent", "Wanted chance to see it", "%")}
        {field("pieceMoney", "One test piece costs", sign)}
        {field("faultyRunPercent", "Runs that start with it", "%")}
        {field("spoiltRunMoney", "Such a run costs, unnoticed", sign)}
      </div>
      <div className="worth" aria-live="polite">
        {reading.ok ? (
          <>
            <p className="worth__answer">{reading.headline}</p>
            <p>{reading.chance}</p>
            <p>{reading.money}</p>
          </>
        ) : (
          <p className="mid">{reading.waitsFor}</p>
        )}
      </div>
      <Rests>
        {rests} Pieces: success-run theorem, 1 − (1 − share)^pieces. It takes for granted that the pieces are struck as
        the parts will be.
      </Rests>
    </div>
  );
}
