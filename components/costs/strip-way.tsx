import Link from "next/link";
import { Caution } from "@/components/ui/caution";
import { Range } from "@/components/ui/range";
import { Slip } from "@/components/ui/slip";

export interface StripWayView {
  slug: string;
  /** The solution, or "Polish back". */
  title: string;
  /** "Electrolytic, 20 to 30 °C, 6 V". */
  meta: string;
  rate: {
    low: number;
    likely: number;
    high: number;
    words: { low: string; likely: string; high: string };
    unit: string;
  };
  /** End of the rate's scale, the same for all ways of a deposit. */
  rateMost: number;
  holding: string | null;
  price: string | null;
  safeOn: string;
  attacks: readonly { metal: string; reason: string }[];
  nobody: string;
  cautions: readonly { words: string; stop: boolean }[];
  sources: readonly { of: string; words: string; isMemory: boolean }[];
  isMemory: boolean;
  changeHref: string;
}

/** One way to strip: its line shows what it is and how fast, pressed it shows everything. */
export function StripWay({ way }: { way: StripWayView }) {
  return (
    <details className="strip-way">
      <summary>
        <span className="strip-way__title">
          {way.title}
          <small>{way.meta}</small>
        </span>
        {way.isMemory && <span className="strip-way__mark src src--memory">from memory</span>}
      </summary>
      <div className="strip-way__body">
        <p className="strip-way__rate">
          <span className="small mid">Rate, {way.rate.unit}</span>
        </p>
        <Range {...way.rate} max={way.rateMost} words={way.rate.words} estimate={way.isMemory} />
        <Slip
          rows={[
            ...(way.holding ? [{ label: "A litre holds", value: way.holding }] : []),
            ...(way.price ? [{ label: "A litre costs", value: way.price }] : []),
          ]}
        />
        <Metals way={way} />
        {way.cautions.map((caution) => (
          <Caution key={caution.words} level={caution.stop ? "stop" : "caution"}>
            {caution.words}
          </Caution>
        ))}
        <ul className="strip-way__sources small">
          {way.sources.map((source) => (
            <li key={source.of}>
              {source.of}: <span className={source.isMemory ? "src src--memory" : "src"}>{source.words}</span>
            </li>
          ))}
        </ul>
        <p>
          <Link className="solo" href={way.changeHref}>
            Change it, or see its earlier rows
          </Link>
        </p>
      </div>
    </details>
  );
}

function Metals({ way }: { way: StripWayView }) {
  return (
    <dl className="strip-way__metals">
      <dt>Safe on</dt>
      <dd>{way.safeOn}</dd>
      {way.attacks.length > 0 && (
        <>
          <dt>Goes on into</dt>
          <dd>
            <ul>
              {way.attacks.map(({ metal, reason }) => (
                <li key={metal}>
                  <b>{metal}</b>. {reason}
                </li>
              ))}
            </ul>
          </dd>
        </>
      )}
      {way.nobody && (
        <>
          <dt>Nobody vouches</dt>
          <dd className="mid">{way.nobody}</dd>
        </>
      )}
    </dl>
  );
}
