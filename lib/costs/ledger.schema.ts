import { z } from "zod";
import { SPANS } from "./period";

/** By what the ledger adds up. */
export const LEDGER_GROUPS = ["cause", "class", "station", "base-metal", "customer"] as const;
export type LedgerGroup = (typeof LEDGER_GROUPS)[number];
export const LEDGER_GROUP_TITLES: Record<LedgerGroup, string> = {
  cause: "Cause",
  class: "Class",
  station: "Station",
  "base-metal": "Base metal",
  customer: "Customer",
};

const day = z.string().regex(/^\d{4}-\d{2}-\d{2}$/, "Write the day as in 2026-07-14.");

/** What the ledger's address may say. Without days it is the last `span`. */
export const ledgerSchema = z
  .object({
    by: z.enum(LEDGER_GROUPS, { error: `Group by one of: ${LEDGER_GROUPS.join(", ")}.` }).default("cause"),
    span: z.enum(SPANS, { error: "Choose month, quarter or year." }).default("month"),
    from: day.optional(),
    to: day.optional(),
    station: z.string().max(60).optional(),
  })
  .refine((input) => (input.from === undefined) === (input.to === undefined), {
    path: ["to"],
    message: "Give both days, or neither.",
  });
export type LedgerQuery = z.output<typeof ledgerSchema>;
