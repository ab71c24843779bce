import { ROLE_TITLES, type Role } from "@/lib/cases/case-words";
import { mailBody, type MailLine } from "./mail-body";

/** A message, ready to be put in the outbox. */
export interface Mail {
  subject: string;
  text: string;
  html: string;
}

/** @param link whole address of the accept page */
export function inviteMail(facts: {
  shopName: string;
  invitedBy: string;
  name: string;
  roles: readonly Role[];
  link: string;
}): Mail {
  const roles = facts.roles.map((role) => ROLE_TITLES[role]).join(", ");
  return mail(`${facts.invitedBy} invites you to ${facts.shopName} on Coppertell`, [
    `Hello ${facts.name},`,
    `${facts.invitedBy} has put you down for the crew of ${facts.shopName} (${roles}).`,
    "Open this link to choose your password. It works once, for seven days.",
    { words: "Join the crew", link: facts.link },
    "If you do not know this shop, leave the mail alone. Nothing happens then.",
  ]);
}

/** @param link whole address of the page where a new password is set */
export function passwordResetMail(facts: { name: string; link: string }): Mail {
  return mail("Set a new Coppertell password", [
    `Hello ${facts.name},`,
    "Open this link to set a new password. It works once, for an hour, and signs you out everywhere else.",
    { words: "Set a new password", link: facts.link },
    "If you did not ask for it, leave the mail alone. Your password stays as it is.",
  ]);
}

export interface WaitingCase {
  ref: string;
  /** Title of the class as called; null when the caller could not tell. */
  calledTitle: string | null;
  job: string;
  quantity: number;
  link: string;
}

/**
 * The bundled message to whoever takes the second look.
 * @param cases at least one, in the order in which they are to be shown
 * @throws RangeError when there is none: then no mail goes out
 */
export function secondLookMail(facts: {
  name: string;
  shopName: string;
  cases: readonly WaitingCase[];
  queueLink: string;
}): Mail {
  const count = facts.cases.length;
  if (count === 0) throw new RangeError("cases must hold at least one");
  const [first] = facts.cases;
  const subject =
    count === 1 && first ? `${first.ref} waits for your second look` : `${count} parts wait for your second look`;
  return mail(`${subject} (${facts.shopName})`, [
    `Hello ${facts.name},`,
    count === 1 ? "A part was put on hold." : `${count} parts were put on hold.`,
    ...facts.cases.map((each) => ({ words: waitingWords(each), link: each.link })),
    { words: "Open the queue", link: facts.queueLink },
    "You choose which mails you get on your account page.",
  ]);
}

function waitingWords(each: WaitingCase): string {
  const parts = each.quantity === 1 ? "1 part" : `${each.quantity} parts`;
  return `${each.ref}: called ${each.calledTitle ?? "can't tell"}, job ${each.job}, ${parts}`;
}

export interface ConfirmedFacts {
  name: string;
  ref: string;
  confirmedBy: string;
  /** Title of the confirmed class; null when the part was released as sound. */
  classTitle: string | null;
  /** Title of the disposition, where one was given. */
  dispositionTitle: string | null;
  link: string;
}

/** To the person who snapped the part, once the second look is done. */
export function caseConfirmedMail(facts: ConfirmedFacts): Mail {
  const subject = facts.classTitle
    ? `${facts.ref} is confirmed: ${facts.classTitle}`
    : `${facts.ref} is released as sound`;
  const said = facts.classTitle
    ? `${facts.confirmedBy} took the second look at ${facts.ref} and confirmed ${facts.classTitle}.`
    : `${facts.confirmedBy} took the second look at ${facts.ref} and found it sound. It may go on.`;
  return mail(subject, [
    `Hello ${facts.name},`,
    said,
    ...(facts.dispositionTitle ? [`Disposition: ${facts.dispositionTitle}.`] : []),
    { words: "Open the case", link: facts.link },
    "You choose which mails you get on your account page.",
  ]);
}

function mail(subject: string, lines: readonly MailLine[]): Mail {
  return { subject, ...mailBody(lines) };
}
