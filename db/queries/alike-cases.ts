import { and, desc, eq, isNotNull, sql } from "drizzle-orm";
import type { ComparedCase } from "@/lib/cases/alike";
import type { Handle } from "../open";
import { preparedOnce } from "../prepared";
import { cases } from "../schema";

/** Newest cases of the class, and of the metal, that are compared: what came last was made by the same hands and tanks. */
const COMPARED = 150;

const comparedColumns = {
  id: cases.id,
  ref: cases.ref,
  openedAt: cases.openedAt,
  baseMetal: cases.baseMetal,
  method: cases.method,
  stageFound: cases.stageFound,
  symptoms: cases.symptoms,
  confirmedClass: cases.confirmedClass,
  calledClass: cases.calledClass,
};

/**
 * Confirmed cases that may be like this one: the newest of its class and the newest on its metal. Two slices of two
 * indexes, so that the number of cases in the book does not matter.
 */
export function listAlikeCandidates(db: Handle, shopId: number, of: Omit<ComparedCase, "openedAt">) {
  const slice = (by: "class" | "metal") =>
    preparedOnce(db, `alike by ${by}`, () =>
      db
        .select(comparedColumns)
        .from(cases)
        .where(
          and(
            eq(cases.shopId, sql.placeholder("shopId")),
            by === "class"
              ? eq(cases.confirmedClass, sql.placeholder("key"))
              : eq(cases.baseMetal, sql.placeholder("key")),
            // The plus keeps the metal's own index: with the class's SQLite would sort all cases of the shop.
            by === "metal" ? isNotNull(sql`+${cases.confirmedClass}`) : undefined,
          ),
        )
        .orderBy(desc(cases.openedAt), desc(cases.id))
        .limit(COMPARED)
        .prepare(),
    );
  const ownClass = of.confirmedClass ?? of.calledClass;
  const found = [
    ...(ownClass === null ? [] : slice("class").all({ shopId, key: ownClass })),
    ...slice("metal").all({ shopId, key: of.baseMetal }),
  ];
  const rows = new Map(found.map((row) => [row.id, row]));
  rows.delete(of.id);
  return [...rows.values()];
}

export type AlikeCandidate = ReturnType<typeof listAlikeCandidates>[number];
