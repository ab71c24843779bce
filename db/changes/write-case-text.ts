import { and, eq, sql } from "drizzle-orm";
import { SYMPTOMS } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { cases, caseTexts, customers, libraryCauses, libraryClasses, workOrders } from "../schema";

/** Writes the words by which the case is found. Called in the transaction that changed any of them. */
export function writeCaseText(tx: Handle, shopId: number, caseId: number): void {
  const row = tx
    .select({
      ref: cases.ref,
      note: cases.note,
      symptoms: cases.symptoms,
      baseMetal: cases.baseMetal,
      alloy: cases.alloy,
      number: workOrders.number,
      partName: workOrders.partName,
      customer: customers.name,
      className: libraryClasses.title,
      synonyms: libraryClasses.synonyms,
      cause: libraryCauses.title,
    })
    .from(cases)
    .innerJoin(workOrders, eq(workOrders.id, cases.workOrderId))
    .innerJoin(customers, eq(customers.id, workOrders.customerId))
    .leftJoin(
      libraryClasses,
      and(
        eq(libraryClasses.shopId, cases.shopId),
        eq(libraryClasses.slug, sql`coalesce(${cases.confirmedClass}, ${cases.calledClass})`),
      ),
    )
    .leftJoin(libraryCauses, eq(libraryCauses.id, cases.confirmedCauseId))
    .where(and(eq(cases.shopId, shopId), eq(cases.id, caseId)))
    .get();
  if (!row) return;
  const text = {
    ref: row.ref,
    job: [row.number, row.customer, row.partName, row.baseMetal, row.alloy ?? ""].join(" ").trim(),
    class: [row.className ?? "", ...(row.synonyms ?? [])].join(" ").trim(),
    cause: row.cause ?? "",
    notes: [row.note, ...row.symptoms.map((symptom) => SYMPTOMS[symptom].words)].join(" ").trim(),
  };
  tx.insert(caseTexts)
    .values({ caseId, shopId, ...text })
    .onConflictDoUpdate({ target: caseTexts.caseId, set: text })
    .run();
}
