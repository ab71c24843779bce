import { CautionList, CostLines, Steps, WayFigure } from "@/components/costs/estimate-way-parts";
import { Button } from "@/components/ui/button";
import { Glyph } from "@/components/ui/glyph";
import type { OfferedWay, StripReckoning } from "@/lib/costs/reckon-strip";
import { STRIP_METHOD_TITLES, type StripMethod } from "@/lib/costs/strip-methods";

interface OfferedStripWayProps {
  way: OfferedWay;
  reckoning: StripReckoning;
  /** End of the one scale of all ways, cents. */
  endCents: number;
  currency: string;
  isChosen: boolean;
  /** "Chosen for this case" where the case has it already. */
  chosenWords: string;
  onPick: (method: StripMethod) => void;
  /** The form that the pick belongs to in a browser without script. */
  formId: string;
}

/** One way that is offered: what it costs and how sure that is, from what, in which steps, with which cautions. */
export function OfferedStripWay(props: OfferedStripWayProps) {
  const { way, reckoning, endCents, currency, isChosen } = props;
  const { estimate, method } = way;
  return (
    <article className={isChosen ? "est-way est-way--chosen" : "est-way"} aria-label={STRIP_METHOD_TITLES[method]}>
      <h3>{STRIP_METHOD_TITLES[method]}</h3>
      <WayFigure estimate={estimate} endCents={endCents} currency={currency} />
      <CostLines estimate={estimate} batch={reckoning.batch} currency={currency} />
      <div className="est-way__foot">
        {isChosen ? (
          <strong className="est-way__chosen">
            <Glyph name="ui-tick" size={22} />
            {props.chosenWords}
          </strong>
        ) : (
          <Button
            wide
            type="submit"
            form={props.formId}
            name="way"
            value={method}
            onClick={(event) => {
              event.preventDefault();
              props.onPick(method);
            }}
          >
            Use this one
          </Button>
        )}
      </div>
      <Steps steps={estimate.steps} />
      <CautionList cautions={estimate.cautions} />
    </article>
  );
}
