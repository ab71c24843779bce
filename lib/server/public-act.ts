import "server-only";
import { setTimeout as pause } from "node:timers/promises";
import { headers } from "next/headers";
import { redirect } from "next/navigation";
import type { z } from "zod";
import { getDb } from "@/db/client";
import type { Db } from "@/db/open";
import { takeTry } from "@/db/queries/sign-in-attempts";
import type { ActState } from "@/lib/act-state";
import { CREW_LIMITS } from "@/lib/crew/crew-limits";
import { tryAgainWords } from "@/lib/crew/try-again";
import { readEnv } from "@/lib/env";
import { fault } from "@/lib/fault";
import { addressOf, watchPeers } from "./address";
import { faultOf, parseInput } from "./faults";
import { readForm, typedValues } from "./form";
import { wakeJobs } from "./job-clock";

interface PublicActDefinition<Schema extends z.ZodType, Result> {
  /** Names the action where its tries are counted and in the log. */
  name: string;
  input: Schema;
  run: (context: { db: Db; now: number; input: z.output<Schema> }) => Result | Promise<Result>;
  /** No answer comes sooner than this, so that its time does not tell what was found. */
  leastMs?: number;
  next?: (result: Result) => string;
}

watchPeers();

/**
 * Builds a server action for people who are not signed in. Order: how often from this address → parse → run → next page.
 * What a stranger may do hangs on the secret in their link, which `run` checks.
 */
export function publicAct<Schema extends z.ZodType, Result>(definition: PublicActDefinition<Schema, Result>) {
  return async (_previous: ActState<Result>, form: FormData): Promise<ActState<Result>> => {
    const least = pause(definition.leastMs ?? 0);
    let result: Result;
    try {
      const now = Date.now();
      const db = getDb();
      await countTry(db, definition.name, now);
      result = await definition.run({ db, now, input: parseInput(definition.input, readForm(form)) });
      wakeJobs();
    } catch (error) {
      await least;
      return { ok: false, fault: faultOf(error, `public action ${definition.name}`), values: typedValues(form) };
    }
    await least;
    // Outside the try: redirect works by throwing.
    if (definition.next) redirect(definition.next(result));
    return { ok: true, value: result };
  };
}

/** @throws FaultError "too-many" */
async function countTry(db: Db, name: string, now: number): Promise<void> {
  const incoming = await headers();
  const address = addressOf((header) => incoming.get(header), readEnv().TRUST_PROXY === "1");
  const keys = [{ key: `p:${name}:${address}`, most: CREW_LIMITS.signInTriesPerAddress }];
  const taken = db.transaction((tx) => takeTry(tx, keys, CREW_LIMITS.signInWindowMs, now), { behavior: "immediate" });
  if (!taken.ok) throw fault("too-many", `Too many tries from here. Try again ${tryAgainWords(taken.waitMs)}.`);
}
