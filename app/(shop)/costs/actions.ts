"use server";

import { ratesInput } from "@/lib/costs/rates.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import { setRates } from "@/lib/server/costs/set-rates";

/** Adds rates from a day on. */
export const addRates = act({
  permission: "rates.set",
  input: ratesInput,
  run: ({ db, member, input, now }) => setRates(db, member, input, now),
  revalidate: () => [routes.rates(), routes.audit()],
});
