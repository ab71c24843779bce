import { z } from "zod";
import { LIMITS, ROLES } from "@/lib/cases/case-words";
import { CREW_LIMITS } from "./crew-limits";
import { MAIL_KINDS } from "./mail-kinds";

/** An e-mail as it is stored: no spaces around it, lower case. */
export const emailInput = z
  .string({ error: "Give an e-mail." })
  .trim()
  .toLowerCase()
  .max(CREW_LIMITS.emailChars, "That e-mail is too long.")
  .pipe(z.email("Write the e-mail in full, like name@shop.com."));

export const personNameInput = z
  .string({ error: "Give a name." })
  // A name goes into subject lines, so it stays on one line.
  .overwrite((name) => name.replace(/\s+/g, " ").trim())
  .min(1, "Give a name.")
  .max(LIMITS.nameChars, `Keep the name to ${LIMITS.nameChars} characters.`);

/** At least one role, each once, in the order of the list. */
export const rolesInput = z
  .array(z.enum(ROLES, "That is not a role."), { error: "Choose at least one role." })
  .min(1, "Choose at least one role.")
  .transform((roles) => ROLES.filter((role) => roles.includes(role)));

/** Only held against its length here; `passwordFault` judges a new one where the e-mail is known. */
const passwordInput = z
  .string({ error: "Give a password." })
  .min(1, "Give a password.")
  .max(CREW_LIMITS.passwordMostChars, `Use at most ${CREW_LIMITS.passwordMostChars} characters.`);

const tokenInput = z.string({ error: "This link is not whole." }).regex(/^[\w-]{43}$/, "This link is not whole.");
const idInput = z.coerce.number({ error: "Reload the page and try again." }).int().positive();

export const signInInput = z.object({ email: emailInput, password: passwordInput });
export const forgotPasswordInput = z.object({ email: emailInput });
export const resetPasswordInput = z.object({ token: tokenInput, password: passwordInput });
export const acceptInviteInput = z.object({ token: tokenInput, name: personNameInput, password: passwordInput });

export const inviteInput = z.object({ email: emailInput, name: personNameInput, roles: rolesInput });
export const inviteIdInput = z.object({ inviteId: idInput });
export const changeRolesInput = z.object({ memberId: idInput, roles: rolesInput });
export const removeMemberInput = z.object({ memberId: idInput });

export const renameInput = z.object({ name: personNameInput });
export const changePasswordInput = z.object({ currentPassword: passwordInput, password: passwordInput });
export const mailChoicesInput = z.object({ kinds: z.array(z.enum(MAIL_KINDS)).default([]) });
export const nothingInput = z.object({});
