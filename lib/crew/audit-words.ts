import { ROLE_TITLES, ROLES, type Role } from "@/lib/cases/case-words";

/** What the audit trail records, each with the words that follow the person's name. */
export const AUDIT_WORDS = {
  "member.invited": "invited",
  "invite.sent-again": "sent the invite again to",
  "invite.revoked": "took back the invite of",
  "member.joined": "joined the crew",
  "member.roles": "changed the roles of",
  "member.removed": "removed from the crew",
  "account.renamed": "changed their own name to",
  "account.password": "changed their own password",
  "account.password-reset": "set a new password by a mailed link",
  "account.signed-out-everywhere": "signed out everywhere",
  "rates.set": "set rates",
  "strip.set": "changed the way to strip",
  "strip.added": "added the way to strip",
  "strip.retired": "retired the way to strip",
  "strip.brought-back": "brought back the way to strip",
  "job.opened": "opened job",
  "job.changed": "changed job",
  "job.closed": "closed job",
  "job.reopened": "opened again job",
  "library.published": "published in the library",
  "library.removed": "removed from the library",
  "library.brought-back": "brought back in the library",
  "library.brought-in": "brought into the library",
} as const satisfies Record<string, string>;
export type AuditAction = keyof typeof AUDIT_WORDS;

/** Done by somebody to themselves: the subject is their name at the time. */
const OWN_ACTIONS: readonly string[] = [
  "member.joined",
  "account.password",
  "account.password-reset",
  "account.signed-out-everywhere",
];

/**
 * What an entry says after the person's name.
 * @example auditSentence({ action: "member.removed", subject: "Tobias", memberName: "Ruth" }) === "removed from the crew Tobias"
 * @example auditSentence({ action: "member.joined", subject: "Ines", memberName: "Ines" }) === "joined the crew"
 */
export function auditSentence(entry: { action: string; subject: string; memberName: string | null }): string {
  const words = auditWords(entry.action);
  if (!OWN_ACTIONS.includes(entry.action)) return `${words} ${entry.subject}`;
  return entry.subject === entry.memberName ? words : `${words}, then called ${entry.subject}`;
}

/** The words of an action; one that this version does not know is shown by its key, never hidden. */
export function auditWords(action: string): string {
  return Object.hasOwn(AUDIT_WORDS, action) ? AUDIT_WORDS[action as AuditAction] : action;
}

/**
 * What an entry's detail adds, as one line; empty when it adds nothing.
 * @example auditDetail({ from: ["plater"], to: ["plater", "senior"] }) === "Plater → Plater, Senior tech"
 */
export function auditDetail(detail: Record<string, unknown>): string {
  const lines: string[] = [];
  if ("from" in detail && "to" in detail) lines.push(`${valueWords(detail.from)} → ${valueWords(detail.to)}`);
  for (const [key, value] of Object.entries(detail)) {
    if (key === "from" || key === "to") continue;
    lines.push(key === "roles" ? valueWords(value) : `${key}: ${valueWords(value)}`);
  }
  return lines.join("; ");
}

function valueWords(value: unknown): string {
  if (Array.isArray(value)) return value.map(valueWords).join(", ") || "none";
  if (typeof value === "string") return isRole(value) ? ROLE_TITLES[value] : value;
  return JSON.stringify(value) ?? "none";
}

function isRole(value: string): value is Role {
  return ROLES.some((role) => role === value);
}
