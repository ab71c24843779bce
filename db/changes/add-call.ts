import { and, eq } from "drizzle-orm";
import type { Sureness } from "@/lib/cases/case-words";
import type { Handle } from "../open";
import { calls, cases } from "../schema";
import type { Doer } from "./case-event";

export interface Caller extends Doer {
  asTrainee: boolean;
}

interface NewCall {
  caseId: number;
  round: number;
  kind: "first" | "further" | "second-look";
  classSlug: string | null;
  sure: Sureness;
}

/** Adds one person's opinion. The case keeps the newest one before the second look as a shortcut for its tag. */
export function addCall(tx: Handle, doer: Caller, call: NewCall): void {
  tx.insert(calls)
    .values({ shopId: doer.shopId, memberId: doer.memberId, asTrainee: doer.asTrainee, at: doer.now, ...call })
    .run();
  if (call.kind === "second-look") return;
  tx.update(cases)
    .set({ calledClass: call.classSlug, calledSure: call.sure })
    .where(and(eq(cases.shopId, doer.shopId), eq(cases.id, call.caseId)))
    .run();
}
