"use server";

import { keepCheckInput } from "@/lib/metals/keep-check.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import { keepPartCheck as keep } from "@/lib/server/metals/keep-part-check";

/** Keeps a weighing on a job: its warning, or the end of one, shows wherever the job does. */
export const keepPartCheck = act({
  permission: "part.check",
  input: keepCheckInput,
  run: ({ db, member, input, now }) => keep(db, member, input, now),
  revalidate: ({ caseRef }) => [
    routes.partCheck(),
    routes.jobs(),
    routes.snap(),
    ...(caseRef === null ? [] : [routes.case(caseRef), routes.secondLook(caseRef)]),
  ],
});
