import { stationGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import type { SignedIn } from "@/db/queries/crew";
import { listSolutions, listStations } from "@/db/queries/line";
import { solutionAge } from "@/lib/line/solution-age";

/** Solutions that are past their window or near its end. Nothing at all when the line is fresh. */
export function LineChecks({ member, now }: { member: SignedIn; now: number }) {
  const db = getDb();
  const stations = listStations(db, member.shopId);
  const due = listSolutions(db, member.shopId)
    .map((solution) => ({ ...solution, age: solutionAge(solution.madeUpAt, solution.windowDays, now) }))
    .filter((solution) => solution.age.share >= 0.9)
    .toSorted((a, b) => b.age.share - a.age.share);
  if (due.length === 0) return null;
  return (
    <Section title="The line">
      <ul>
        {due.map((solution) => {
          const station = stations.find((each) => each.id === solution.stationId);
          return (
            <li className="row" key={solution.id}>
              {station && <Glyph name={stationGlyph(station.kind)} size={32} />}
              <span>
                <strong>{`${station?.name ?? "Line"}, ${solution.code}`}</strong>
                <br />
                <span
                  className={solution.age.daysOver > 0 ? "small warn" : "small mid"}
                >{`${solution.name}: ${solution.age.words}`}</span>
              </span>
            </li>
          );
        })}
      </ul>
    </Section>
  );
}
