"use server";

import { addBathInput, changeBathInput, changePolishingInput, turnWayInput } from "@/lib/costs/strip-row.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as strips from "@/lib/server/costs/set-strips";

const showing = () => [routes.stripWays(), routes.strip(), routes.audit()];

export const changeBath = act({
  permission: "strips.set",
  input: changeBathInput,
  run: ({ db, member, input, now }) => strips.changeBath(db, member, input, now),
  revalidate: showing,
});

export const changePolishing = act({
  permission: "strips.set",
  input: changePolishingInput,
  run: ({ db, member, input, now }) => strips.changePolishing(db, member, input, now),
  revalidate: showing,
});

export const addBath = act({
  permission: "strips.set",
  input: addBathInput,
  run: ({ db, member, input, now }) => strips.addBath(db, member, input, now),
  revalidate: showing,
  next: ({ slug }) => routes.stripWays({ way: slug }),
});

export const turnWay = act({
  permission: "strips.set",
  input: turnWayInput,
  run: ({ db, member, input, now }) => strips.turnWay(db, member, input, now),
  revalidate: showing,
});
