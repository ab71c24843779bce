"use server";

import {
  amendSchema,
  backSchema,
  callSchema,
  chooseStripSchema,
  confirmationSchema,
  disposeSchema,
  exemplarSchema,
  outcomeSchema,
  releaseSchema,
  tickSchema,
} from "@/lib/cases/case.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as changes from "@/lib/server/cases/change-case";
import { chooseExemplar } from "@/lib/server/cases/choose-exemplar";

/** Pages that show a case or count it. */
const showing = ({ ref }: { ref: string }) => [routes.today(), routes.case(ref), routes.queue(), routes.reworkList()];

export const addCall = act({
  permission: "case.call",
  input: callSchema,
  run: ({ input, ...doing }) => changes.call(doing, input),
  revalidate: showing,
});

export const confirmCase = act({
  permission: "case.confirm",
  input: confirmationSchema,
  run: ({ input, ...doing }) => changes.confirm(doing, input),
  revalidate: showing,
});

export const releaseCase = act({
  permission: "case.confirm",
  input: releaseSchema,
  run: ({ input, ...doing }) => changes.release(doing, input),
  revalidate: showing,
});

export const tickStep = act({
  permission: "card.work",
  input: tickSchema,
  run: ({ input, ...doing }) => changes.tick(doing, input),
  revalidate: showing,
});

export const recordOutcome = act({
  permission: "card.work",
  input: outcomeSchema,
  run: ({ input, ...doing }) => changes.outcome(doing, input),
  revalidate: showing,
});

export const disposeCase = act({
  permission: "case.confirm",
  input: disposeSchema,
  run: ({ input, ...doing }) => changes.dispose(doing, input),
  revalidate: showing,
});

export const takeBack = act({
  permission: "case.confirm",
  input: backSchema,
  run: ({ input, ...doing }) => changes.takeConfirmationBack(doing, input),
  revalidate: showing,
});

export const reopenCase = act({
  permission: "case.confirm",
  input: backSchema,
  run: ({ input, ...doing }) => changes.reopen(doing, input),
  revalidate: showing,
});

export const amendCase = act({
  permission: "case.amend",
  input: amendSchema,
  run: ({ input, ...doing }) => changes.amend(doing, input),
  revalidate: showing,
});

/** How the deposit is to come off; an empty method takes the choice away. */
export const chooseStripMethod = act({
  permission: "case.confirm",
  input: chooseStripSchema,
  run: ({ input, ...doing }) => changes.planStrip(doing, input),
  revalidate: showing,
});

export const setExemplar = act({
  permission: "exemplar.choose",
  input: exemplarSchema,
  run: ({ input, ...doing }) => chooseExemplar(doing, input),
  revalidate: showing,
});
