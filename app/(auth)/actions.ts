"use server";

import { acceptInviteInput, forgotPasswordInput, resetPasswordInput } from "@/lib/crew/crew.schema";
import { doorPath } from "@/lib/crew/door-words";
import { acceptInvite } from "@/lib/server/crew/invites";
import { requestPasswordReset, resetPassword } from "@/lib/server/crew/password-resets";
import { publicAct } from "@/lib/server/public-act";

/** Answers the same, in the same time, whether anybody has that e-mail or not. */
export const askForReset = publicAct({
  name: "forgot-password",
  input: forgotPasswordInput,
  leastMs: 400,
  run: ({ db, input, now }) => requestPasswordReset(db, input.email, now),
});

export const setNewPassword = publicAct({
  name: "reset-password",
  input: resetPasswordInput,
  run: ({ db, input, now }) => resetPassword(db, input, now),
  next: () => doorPath("password"),
});

export const joinCrew = publicAct({
  name: "accept-invite",
  input: acceptInviteInput,
  run: async ({ db, input, now }): Promise<void> => {
    await acceptInvite(db, input, now);
  },
  next: () => doorPath("joined"),
});
