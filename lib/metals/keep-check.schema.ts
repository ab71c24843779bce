import { z } from "zod";
import { caseRef } from "@/lib/cases/case.schema";

/** A field of the check as it was typed; the computation reads it, as it does in the browser. */
const typed = z.string({ error: "Type the weights first." }).max(20, "Keep it to 20 characters.");

const nothing = (raw: unknown) => (raw === "" || raw === null ? undefined : raw);

/** What keeps a check on a job: the fields as typed, and the job; and the case that it was weighed for. */
export const keepCheckInput = z.object({
  air: typed,
  water: typed,
  temp: typed,
  error: typed,
  pull: typed.default(""),
  colour: typed.default(""),
  jobId: z.coerce.number({ error: "Choose the job." }).int("Choose the job.").positive("Choose the job."),
  case: z.preprocess(nothing, caseRef.optional()),
});
export type KeepCheck = z.output<typeof keepCheckInput>;
