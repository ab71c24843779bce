import "server-only";
import { revalidatePath } from "next/cache";
import { redirect } from "next/navigation";
import type { z } from "zod";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import type { ActState } from "@/lib/act-state";
import type { Permission } from "@/lib/permissions";
import { demand, faultOf, parseInput } from "./faults";
import { readForm, typedValues } from "./form";
import { wakeJobs } from "./job-clock";
import { currentMember } from "./session";

interface ActDefinition<Schema extends z.ZodType, Result> {
  permission: Permission;
  input: Schema;
  /** Loads the row, checks that this person may touch this row, applies the rule, writes in one transaction. */
  run: (context: { member: SignedIn; db: Db; now: number; input: z.output<Schema> }) => Result | Promise<Result>;
  /** Paths whose pages show what changed. */
  revalidate?: (result: Result) => string[];
  /** Where the person goes next; without it they stay on the form. */
  next?: (result: Result) => string;
}

/**
 * Builds a server action for `useActionState`. Order: who → may they → parse → run → revalidate → next page.
 * A fault comes back with what was typed, because React empties a form once its action has run.
 */
export function act<Schema extends z.ZodType, Result>(definition: ActDefinition<Schema, Result>) {
  return async (_previous: ActState<Result>, form: FormData): Promise<ActState<Result>> => {
    let result: Result;
    try {
      const member = demand(await currentMember(), definition.permission);
      const input = parseInput(definition.input, readForm(form));
      result = await definition.run({ member, db: getDb(), now: Date.now(), input });
      wakeJobs();
    } catch (error) {
      return { ok: false, fault: faultOf(error, `action ${definition.permission}`), values: typedValues(form) };
    }
    for (const path of definition.revalidate?.(result) ?? []) revalidatePath(path);
    // Outside the try: redirect works by throwing.
    if (definition.next) redirect(definition.next(result));
    return { ok: true, value: result };
  };
}
