import "server-only";
import { randomBytes } from "node:crypto";
import { z } from "zod";
import type { SignedIn } from "@/db/queries/crew";
import { fault, FaultError, type Fault } from "@/lib/fault";
import { InputError } from "@/lib/input-error";
import { can, rolesFor, type Permission } from "@/lib/permissions";
import { ROLE_TITLES } from "@/lib/cases/case-words";

/** Turns whatever was thrown into a fault for the person. What they cannot use goes to the log under a short mark. */
export function faultOf(error: unknown, where: string): Fault {
  if (error instanceof FaultError) return error.fault;
  // A computation refused its input: its words are for the person.
  if (error instanceof InputError) {
    return { code: "invalid", message: `${error.field}: ${error.problem}`, fields: { [error.field]: error.problem } };
  }
  const ref = randomBytes(3).toString("hex").toUpperCase();
  console.error(`[${ref}] ${where}`, error);
  return {
    code: "broken",
    message: `Something broke on our side and nothing was saved. Try again; if it stays, tell the owner this mark: ${ref}.`,
    ref,
  };
}

/** @throws FaultError "signed-out" or "refused" */
export function demand(member: SignedIn | null, permission: Permission): SignedIn {
  if (!member) throw fault("signed-out", "You are signed out. Sign in again; what you typed stays here.");
  if (!can(member, permission)) throw fault("refused", refusalWords(permission));
  return member;
}

/** Says who may, since "forbidden" helps nobody. */
export function refusalWords(permission: Permission): string {
  const who = rolesFor(permission).map((role) => ROLE_TITLES[role].toLowerCase());
  return `That is for ${who.length > 1 ? `${who.slice(0, -1).join(", ")} or ${who.at(-1)}` : `the ${who[0]}`}. Ask them, or ask the owner for the role.`;
}

/**
 * Parses input at the boundary.
 * @throws FaultError "invalid" with one sentence per field
 */
export function parseInput<Schema extends z.ZodType>(schema: Schema, raw: unknown): z.output<Schema> {
  const result = schema.safeParse(raw);
  if (result.success) return result.data;
  const fields: Record<string, string> = {};
  for (const issue of result.error.issues) fields[issue.path.join(".") || "form"] ??= issue.message;
  const first = Object.entries(fields)[0];
  throw fault(
    "invalid",
    first ? `Not saved. ${first[0] === "form" ? "" : `${first[0]}: `}${first[1]}` : "Not saved.",
    fields,
  );
}
