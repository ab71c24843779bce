"use server";

import { changePasswordInput, mailChoicesInput, nothingInput, renameInput } from "@/lib/crew/crew.schema";
import { doorPath } from "@/lib/crew/door-words";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import { changePassword, chooseMails, renameSelf, signOutEverywhere } from "@/lib/server/crew/account";
import { forgetSession } from "@/lib/server/forget-session";

const showing = () => [routes.account()];

export const renameMe = act({
  permission: "account.edit",
  input: renameInput,
  run: ({ db, member, input, now }) => renameSelf(db, member, input.name, now),
  revalidate: showing,
});

export const chooseMyMails = act({
  permission: "account.edit",
  input: mailChoicesInput,
  run: ({ db, member, input }) => chooseMails(db, member, input.kinds),
  revalidate: showing,
});

export const changeMyPassword = act({
  permission: "account.edit",
  input: changePasswordInput,
  run: ({ db, member, input, now }) => changePassword(db, member, input, now),
  next: () => doorPath("password"),
});

export const signMeOut = act({
  permission: "account.edit",
  input: nothingInput,
  run: () => forgetSession(),
  next: () => doorPath("out"),
});

export const signMeOutEverywhere = act({
  permission: "account.edit",
  input: nothingInput,
  run: async ({ db, member, now }): Promise<void> => {
    signOutEverywhere(db, member, now);
    await forgetSession();
  },
  next: () => doorPath("everywhere"),
});
