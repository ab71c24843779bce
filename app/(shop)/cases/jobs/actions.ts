"use server";

import { changeJobInput, jobIdInput, openJobInput } from "@/lib/cases/job.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as jobs from "@/lib/server/cases/jobs";

const showing = () => [routes.jobs(), routes.snap(), routes.today(), routes.audit()];

export const openJob = act({
  permission: "job.keep",
  input: openJobInput,
  run: ({ db, member, input, now }) => jobs.openJob(db, member, input, now),
  revalidate: showing,
});

export const changeJob = act({
  permission: "job.change",
  input: changeJobInput,
  run: ({ db, member, input, now }) => jobs.changeJob(db, member, input, now),
  revalidate: showing,
});

export const closeJob = act({
  permission: "job.change",
  input: jobIdInput,
  run: ({ db, member, input, now }) => jobs.closeJob(db, member, input.jobId, now),
  revalidate: showing,
});

export const reopenJob = act({
  permission: "job.change",
  input: jobIdInput,
  run: ({ db, member, input, now }) => jobs.reopenJob(db, member, input.jobId, now),
  revalidate: showing,
});
