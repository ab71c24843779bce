import type { CSSProperties } from "react";
import { Rests } from "@/components/ui/rests";
import { Section } from "@/components/ui/section";
import type { StripReckoning } from "@/lib/costs/reckon-strip";
import { narrowWords, scrapWords, spreadByName, thicknessRangeWords } from "@/lib/costs/strip-basis";

/** Below a hundredth of the spread a thing has no bar of its own. */
const LEAST_SHOWN_SHARE = 0.01;
const MOST_SHOWN = 6;

type ShareStyle = CSSProperties & Record<"--v", number>;
const shareStyle = (share: number): ShareStyle => ({ "--v": share * 100 });

/** What widens the range, by its share of the spread, and what to do about the widest. */
export function StripSpread({ reckoning }: { reckoning: StripReckoning }) {
  const spread = spreadByName(reckoning.chosen.spread);
  const shown = spread.filter(({ share }) => share >= LEAST_SHOWN_SHARE).slice(0, MOST_SHOWN);
  const restShare =
    spread.reduce((sum, { share }) => sum + share, 0) - shown.reduce((sum, { share }) => sum + share, 0);
  const rest = spread.filter((each) => !shown.includes(each)).map(({ name }) => name.toLowerCase());
  return (
    <Section title="What widens the range" aside="Share of the spread">
      {shown.length === 0 && <p>Nothing: every figure of this batch is exact.</p>}
      <ol className="est-spread">
        {shown.map(({ name, share }, index) => (
          <li key={name}>
            <b>{nameWords(name, reckoning)}</b>
            <span className="fig">{Math.round(share * 100)}%</span>
            <i className="share-bar" style={shareStyle(share)} />
            {index === 0 && narrowWords(name) && <span className="est-spread__do">{narrowWords(name)}</span>}
          </li>
        ))}
      </ol>
      {rest.length > 0 && restShare > 0 && (
        <Rests>
          {restShare < 0.005 ? "Next to nothing" : `The other ${Math.max(1, Math.round(restShare * 100))}%`}:{" "}
          {rest.join(", ")}.
        </Rests>
      )}
    </Section>
  );
}

function nameWords(name: string, reckoning: StripReckoning): string {
  if (name === "Scrap risk") return `Scrap risk, ${scrapWords(reckoning)}`;
  const range = thicknessRangeWords(reckoning, name);
  return range ? `${name}, ${range}` : name;
}
