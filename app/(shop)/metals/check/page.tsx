import type { Metadata } from "next";
import { CheckRoute } from "@/components/metals/check-route";
import { PartCheckSheet } from "@/components/metals/part-check-sheet";
import type { CheckStart, JobToCheck } from "@/components/metals/use-part-check";
import { ShopShell } from "@/components/shell/shop-shell";
import { getDb } from "@/db/client";
import { listSeniorNames } from "@/db/queries/snap-choices";
import type { BaseMetal } from "@/lib/cases/case-words";
import type { Query } from "@/lib/metals/check-address";
import { readPart } from "@/lib/metals/part-reading";
import { readTypedCheck, type ShopUnits } from "@/lib/metals/typed-check";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { keepPartCheck } from "../actions";
import { loadCheck } from "./load-check";

export const metadata: Metadata = { title: "What is this part?" };

interface PartCheckPageProps {
  searchParams: Promise<Query>;
}

/** What is this part made of? The address carries the job, the case and the weights: reloaded or shared, it says the same. */
export default async function PartCheckPage({ searchParams }: PartCheckPageProps) {
  const query = await searchParams;
  const member = await guardPage("part.check", routes.partCheck());
  const db = getDb();
  const { units } = member.shop;
  const { start, jobs } = loadCheck(db, member, query, Date.now());
  const metal = metalOfAddress(start, jobs, units);
  const { actor, counts } = shellFor(member);
  return (
    // The sheet brings its own thumb bar: its main action changes with what was weighed.
    <ShopShell actor={actor} counts={counts} here="metals" thumb={<></>}>
      <PartCheckSheet
        start={start}
        units={units}
        jobs={jobs}
        seniors={listSeniorNames(db, member.shopId).map((name) => name.split(" ")[0] ?? name)}
        givenRoute={metal && { baseMetal: metal, node: <CheckRoute baseMetal={metal} /> }}
        back={start.caseRef === null ? null : routes.case(start.caseRef)}
        keep={keepPartCheck}
      />
    </ShopShell>
  );
}

/** The metal whose route comes with the page: the job's where it fits, else the likeliest. */
function metalOfAddress(start: CheckStart, jobs: readonly JobToCheck[], units: ShopUnits): BaseMetal | null {
  const read = readTypedCheck(start.typed, units);
  if (read.kind !== "ready") return null;
  const metals = readPart(read.input).candidates.map((each) => each.baseMetal);
  const declared = jobs.find((each) => each.number === start.job)?.baseMetal;
  return metals.find((metal) => metal === declared) ?? metals[0] ?? null;
}
