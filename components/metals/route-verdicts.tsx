import { Glyph } from "@/components/ui/glyph";
import type { Verdicts } from "@/lib/metals/pretreatment/route";

/** What suits this metal beside what does not, each with its reason: strikes or activators. */
export function RouteVerdicts({ suits, unsuitable }: Verdicts) {
  return (
    <div className="route-verdicts">
      <VerdictList title="Suits" glyph="ui-tick" verdicts={suits} />
      <VerdictList title="Does not suit" glyph="ui-cross" verdicts={unsuitable} />
    </div>
  );
}

interface VerdictListProps {
  title: string;
  glyph: "ui-tick" | "ui-cross";
  verdicts: Verdicts["suits"];
}

function VerdictList({ title, glyph, verdicts }: VerdictListProps) {
  if (verdicts.length === 0) return null;
  return (
    <div className={glyph === "ui-tick" ? "route-verdict route-verdict--suits" : "route-verdict"}>
      <h3>{title}</h3>
      <ul>
        {verdicts.map((verdict) => (
          <li key={verdict.name}>
            <Glyph name={glyph} />
            <div>
              <strong>{verdict.name}</strong>
              <p>{verdict.why}</p>
              <p className="route-source">Source: {verdict.source}</p>
            </div>
          </li>
        ))}
      </ul>
    </div>
  );
}
