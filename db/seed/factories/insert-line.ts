import type { StationKind } from "@/lib/cases/case-words";
import type { Handle } from "../../open";
import { solutionEvents, solutions, stations } from "../../schema";

/** The line as most shops run it. Two rinses, because what is dragged out of one tank spoils the next. */
export const USUAL_LINE: readonly { slug: string; kind: StationKind; name: string }[] = [
  { slug: "clean", kind: "clean", name: "Clean" },
  { slug: "rinse-1", kind: "rinse", name: "Rinse" },
  { slug: "activate", kind: "activate", name: "Activate" },
  { slug: "rinse-2", kind: "rinse", name: "Rinse" },
  { slug: "strike", kind: "strike", name: "Strike" },
  { slug: "inspect", kind: "inspect", name: "Inspect" },
  { slug: "plate", kind: "plate", name: "Plate" },
  { slug: "finish", kind: "finish", name: "Finish" },
];

/** Lays the line of a shop. Returns the row number of each station by slug. */
export function insertLine(tx: Handle, shopId: number, line = USUAL_LINE): Map<string, number> {
  const ids = new Map<string, number>();
  for (const [position, station] of line.entries()) {
    const { id } = tx
      .insert(stations)
      .values({ shopId, position, ...station })
      .returning({ id: stations.id })
      .get();
    ids.set(station.slug, id);
  }
  return ids;
}

interface NewSolution {
  shopId: number;
  stationId: number;
  code: string;
  name: string;
  windowDays: number;
  madeUpAt: number;
  method?: "bath" | "brush" | null;
  retiredAt?: number | null;
  /** Who made it up. */
  memberId: number;
}

/** Puts a solution on the line and logs its make-up. */
export function insertSolution(tx: Handle, solution: NewSolution): number {
  const { memberId, ...columns } = solution;
  const { id } = tx.insert(solutions).values(columns).returning({ id: solutions.id }).get();
  tx.insert(solutionEvents)
    .values({ shopId: solution.shopId, solutionId: id, kind: "made-up", memberId, at: solution.madeUpAt })
    .run();
  return id;
}
