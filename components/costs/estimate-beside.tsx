import { CautionList, CostLines, WayFigure } from "@/components/costs/estimate-way-parts";
import { Glyph } from "@/components/ui/glyph";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { STRIP_METHOD_TITLES } from "@/lib/costs/strip-methods";
import { besideWords } from "@/lib/costs/strip-words";

interface StripBesideProps {
  reckoning: StripReckoning;
  endCents: number;
  currency: string;
}

/** The same fault at the other stage: at the strike, or, for one that was seen there, once it has gone on. */
export function StripBeside({ reckoning, endCents, currency }: StripBesideProps) {
  const { kind, estimate } = reckoning.beside;
  const title = kind === "at-strike" ? "At the strike" : "If it goes on";
  return (
    <article className="est-way est-way--beside" aria-label={title}>
      <h3>
        <Glyph name={kind === "at-strike" ? "station-strike" : "station-plate"} size={28} />
        {title}
      </h3>
      <WayFigure estimate={estimate} endCents={endCents} currency={currency} />
      <CostLines estimate={estimate} batch={reckoning.batch} currency={currency} />
      <p className="est-way__why">{besideWords(reckoning)}</p>
      <p className="rests">
        The same parts, {STRIP_METHOD_TITLES[estimate.method].toLowerCase()}, the same rates. Only what lies on the part
        by then is taken off and put on again.
      </p>
      <CautionList cautions={estimate.cautions} />
    </article>
  );
}
