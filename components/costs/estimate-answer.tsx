import Link from "next/link";
import type { StripEstimatorProps } from "@/components/costs/strip-estimator";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Rests } from "@/components/ui/rests";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { answerWords, roundMoney } from "@/lib/costs/strip-words";
import { routes } from "@/lib/routes";

interface StripAnswerProps extends Pick<StripEstimatorProps, "origin" | "originFault" | "ratesWords"> {
  reckoning: StripReckoning | null;
  /** A field has to be mended before the figures follow. */
  isWaiting: boolean;
}

/** The page's opening: where the batch comes from, the answer in a sentence, and what it rests on. */
export function StripAnswer({ origin, originFault, ratesWords, reckoning, isWaiting }: StripAnswerProps) {
  return (
    <>
      <nav className="crumb no-print" aria-label="This batch">
        <span>{origin && <Link href={origin.href}>{origin.words}</Link>}</span>
        {/* A plain link: the page starts anew, fields and all. */}
        <a href={routes.strip()}>Start empty</a>
      </nav>
      <div className="est-head no-print">
        <Lead>
          {reckoning ? answerWords(reckoning, ratesWords.currency) : "Mend the marked fields, and the figures follow."}
        </Lead>
        {reckoning && <Rests>{restWords(reckoning, ratesWords, origin?.kind === "case")}</Rests>}
        {originFault && (
          <Note tone="amber" title="Nothing was filled in">
            {originFault}
          </Note>
        )}
        {reckoning && isWaiting && (
          <Note tone="amber" title="The figures wait for the marked field" role="status">
            They are those before the last change.
          </Note>
        )}
        {reckoning?.passedOver && (
          <Note tone="rust" title="The way that was picked is not offered here">
            {reckoning.passedOver} The cheapest that is offered stands in for it.
          </Note>
        )}
        {reckoning && <WorthLess reckoning={reckoning} currency={ratesWords.currency} />}
      </div>
    </>
  );
}

function restWords({ chosen }: StripReckoning, { from, currency }: StripEstimatorProps["ratesWords"], isCase: boolean) {
  const range = `${roundMoney(chosen.low90Cents, currency)} to ${roundMoney(chosen.high90Cents, currency)}`;
  const day = isCase ? "those of the case’s day" : "today’s";
  return `Estimate, ${STRIP_METHOD_TITLES[chosen.method].toLowerCase()}. 90% range ${range}. Rates of ${from}, ${day}.`;
}

/** Parts that are worth less than the strip: said before anybody starts. */
function WorthLess({ reckoning, currency }: { reckoning: StripReckoning; currency: string }) {
  const { batch, chosen } = reckoning;
  if (batch.partValueCents === undefined) return null;
  const worthCents = batch.partValueCents * batch.quantity;
  if (worthCents >= chosen.meanCents) return null;
  const who = batch.quantity === 1 ? "The part is" : "The parts are";
  return (
    <Note tone="amber" title={`${who} worth less than this`}>
      {roundMoney(worthCents, currency)} in all, against {roundMoney(chosen.meanCents, currency)}. Ask whether new ones
      come cheaper.
    </Note>
  );
}
