import type { ReactNode } from "react";
import { StripBasis } from "@/components/costs/estimate-basis-table";
import { StripBeside } from "@/components/costs/estimate-beside";
import { StripChoice } from "@/components/costs/estimate-choice";
import { STRIP_CHOICE_ID, STRIP_FORM_ID, type StripEstimatorProps } from "@/components/costs/strip-estimator";
import { RefusedStripWay } from "@/components/costs/estimate-refused-way";
import { StripSheet } from "@/components/costs/strip-sheet";
import { StripSpread } from "@/components/costs/estimate-spread";
import { OfferedStripWay } from "@/components/costs/estimate-way";
import { WorthCheck } from "@/components/costs/worth-check";
import { Button } from "@/components/ui/button";
import { Section } from "@/components/ui/section";
import { SubmitButton } from "@/components/ui/submit-button";
import { scaleEndCents, type StripReckoning } from "@/lib/costs/reckon-strip";
import { queryOf, type StripTyped } from "@/lib/costs/strip-address";
import { correctionWords } from "@/lib/costs/strip-basis";
import { LEAST_PAIRS } from "@/lib/costs/correction";
import type { StripMethod } from "@/lib/costs/strip-methods";
import { roundMoney } from "@/lib/costs/strip-words";

interface StripResultsProps extends StripEstimatorProps {
  typed: StripTyped;
  reckoning: StripReckoning;
  /** What is shown is older than what is typed. */
  isWaiting: boolean;
  onPick: (method: StripMethod) => void;
  /** The button that copies the address. */
  share: ReactNode;
}

/** Everything below the fields: the ways side by side, the spread, what it rests on, the check, and the sheet for print. */
export function StripResults(props: StripResultsProps) {
  const { reckoning, isWaiting, ratesWords } = props;
  const correction = correctionFor(props);
  return (
    <>
      <div className={isWaiting ? "est-results est-results--waits no-print" : "est-results no-print"}>
        <Ways {...props} />
        <div className="est-two">
          <div>
            <StripSpread reckoning={reckoning} />
            <WorthSection {...props} />
          </div>
          <div>
            <StripBasis reckoning={reckoning} rates={ratesWords} correction={correction} />
            <Finish {...props} />
          </div>
        </div>
      </div>
      <div className="only-print">
        <StripSheet
          for="shop"
          shopName={props.shopName}
          printedOn={props.today}
          reckoning={reckoning}
          ratesWords={ratesWords}
          correction={correction}
          origin={props.origin}
        />
      </div>
    </>
  );
}

function Ways({ reckoning, ratesWords, origin, typed, onPick }: StripResultsProps) {
  const { currency } = ratesWords;
  const endCents = scaleEndCents([...reckoning.offered.map((way) => way.estimate), reckoning.beside.estimate]);
  return (
    <Section
      title="Ways to take it off"
      aside={`All bars run ${roundMoney(0, currency)} to ${roundMoney(endCents, currency)}. Box: 90% range. Heavy mark: mean.`}
    >
      <div className="est-ways">
        {reckoning.offered.map((way) => (
          <OfferedStripWay
            key={way.method}
            way={way}
            reckoning={reckoning}
            endCents={endCents}
            currency={currency}
            isChosen={way.method === reckoning.chosen.method}
            chosenWords={chosenWords(way.method, origin, typed)}
            onPick={onPick}
            formId={STRIP_FORM_ID}
          />
        ))}
        {reckoning.refused.map((way) => (
          <RefusedStripWay key={way.method} way={way} baseMetal={reckoning.batch.baseMetal} />
        ))}
        <StripBeside reckoning={reckoning} endCents={endCents} currency={currency} />
      </div>
    </Section>
  );
}

function chosenWords(method: StripMethod, origin: StripResultsProps["origin"], typed: StripTyped): string {
  if (origin?.own.way === method) return "Chosen for this case";
  return typed.way === method ? "Picked" : "The cheapest";
}

function Finish({ origin, typed, reckoning, chooseAction, share }: StripResultsProps) {
  const print = (
    <Button glyph="ui-print" onClick={() => window.print()}>
      Print the sheet
    </Button>
  );
  if (!origin?.canChoose) {
    return (
      <div className="est-fin btns">
        {print}
        {share}
      </div>
    );
  }
  return (
    <StripChoice
      id={STRIP_CHOICE_ID}
      caseRef={origin.key}
      caseHref={origin.href}
      method={reckoning.chosen.method}
      isOther={isAnotherBatch(typed, origin.own)}
      action={chooseAction}
    >
      <div className="est-fin btns">
        <SubmitButton variant="main" className="desk-only">
          Put this on the case
        </SubmitButton>
        {print}
        {share}
      </div>
    </StripChoice>
  );
}

function isAnotherBatch(typed: StripTyped, own: StripTyped): boolean {
  const plain = (each: StripTyped) => JSON.stringify(queryOf({ ...each, way: "", alloy: "" }));
  return plain(typed) !== plain(own);
}

function correctionFor({ corrections, origin, reckoning }: StripResultsProps): string {
  const { method } = reckoning.chosen;
  const ofMethod = corrections.filter((row) => row.method === method);
  const row =
    ofMethod.find((each) => each.classSlug === (origin?.classSlug ?? null) && each.correction.enough) ??
    ofMethod.find((each) => each.classSlug === null);
  return correctionWords(method, row?.correction ?? { enough: false, have: 0, need: LEAST_PAIRS });
}

/** What a miss costs is this batch's: a part put right later, against one put right at the strike. */
function WorthSection({ worth, reckoning, ratesWords }: StripResultsProps) {
  if (!worth) return null;
  const { chosen, beside, batch } = reckoning;
  const [strike, later] = beside.kind === "at-strike" ? [beside.estimate, chosen] : [chosen, beside.estimate];
  const missCents = Math.max(0, later.meanCents - strike.meanCents) / batch.quantity;
  return (
    <Section title="Is looking at every strike worth it" aside="Parts like these" className="est-worth">
      <WorthCheck {...worth} missCents={missCents} missFrom="estimate for these parts" currency={ratesWords.currency} />
    </Section>
  );
}
