"use server";

import { answerInput, askInput, drillIdInput, drillInput } from "@/lib/practice/practice.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as drills from "@/lib/server/practice/drills";
import * as practise from "@/lib/server/practice/practise";

export const askForPhoto = act({
  permission: "practice.do",
  input: askInput,
  run: ({ db, member, input, now }) => practise.askQuestion({ db, member, now }, input),
  next: ({ id }) => routes.practiceQuestion(id),
});

export const callPhoto = act({
  permission: "practice.do",
  input: answerInput,
  run: ({ db, member, input, now }) => practise.answerQuestion({ db, member, now }, input),
  revalidate: ({ id }) => [routes.practiceQuestion(id), routes.practice(), routes.practiceProgress(), routes.today()],
  next: ({ id }) => routes.practiceQuestion(id),
});

export const setDrill = act({
  permission: "drill.set",
  input: drillInput,
  run: ({ db, member, input, now }) => drills.setDrill({ db, member, now }, input),
  revalidate: () => [routes.practiceDrills(), routes.practice(), routes.today()],
});

export const withdrawDrill = act({
  permission: "drill.set",
  input: drillIdInput,
  run: ({ db, member, input, now }) => drills.withdrawDrill({ db, member, now }, input.drillId),
  revalidate: () => [routes.practiceDrills(), routes.practice(), routes.today()],
});
