import "server-only";
import type { Db, Handle } from "@/db/open";
import type { Caller } from "@/db/changes/add-call";
import { addCall } from "@/db/changes/add-call";
import type { CaseRow } from "@/db/changes/case-event";
import { chooseStrip } from "@/db/changes/choose-strip";
import { amendCase, disposeCase, reopenCase, takeBack } from "@/db/changes/close-case";
import { confirmCase, releaseCase } from "@/db/changes/confirm-case";
import { recordOutcome, tickStep } from "@/db/changes/do-rework";
import { openCase } from "@/db/changes/open-case";
import { writeCaseText } from "@/db/changes/write-case-text";
import { requireCase } from "@/db/queries/cases";
import type { SignedIn } from "@/db/queries/crew";
import { hasClass } from "@/db/queries/snap-facts";
import type { Amendment, CallInput, Confirmation, OutcomeInput, Snap, StripChoice } from "@/lib/cases/case.schema";
import { fault } from "@/lib/fault";
import { can, type Permission } from "@/lib/permissions";
import { announceConfirmed } from "../mail/announce-confirmed";
import { announceHeldCase } from "../mail/announce-held";
import { refusalWords } from "../faults";

/**
 * Everything that can be done to a case, as actions and routes call it: one transaction each, with the messages it
 * causes. The person and their shop come from the session, never from the input.
 */
interface Doing {
  db: Db;
  member: SignedIn;
  now: number;
}

interface Done {
  ref: string;
}

const callerOf = ({ member, now }: Doing): Caller => ({
  shopId: member.shopId,
  memberId: member.memberId,
  now,
  asTrainee: member.roles.every((role) => role === "trainee"),
});

/** Loads the case of this shop, checks that this person may touch this row, and changes it in one transaction. */
function change(
  doing: Doing,
  ref: string,
  permission: Permission,
  apply: (tx: Handle, caller: Caller, row: CaseRow) => void,
): Done {
  doing.db.transaction(
    (tx) => {
      const row = requireCase(tx, doing.member.shopId, ref);
      if (!can(doing.member, permission, row)) throw fault("refused", refusalWords(permission));
      apply(tx, callerOf(doing), row);
    },
    { behavior: "immediate" },
  );
  return { ref };
}

/** Opens a case and tells the seniors. The same snap sent twice opens one case and tells them once. */
export function snap(doing: Doing, input: Snap): Done {
  return doing.db.transaction(
    (tx) => {
      const opened = openCase(tx, { ...callerOf(doing), timeZone: doing.member.shop.timeZone }, input);
      if (opened.isNew) announceHeldCase(tx, { shopId: doing.member.shopId, now: doing.now });
      return { ref: opened.ref };
    },
    { behavior: "immediate" },
  );
}

export function call(doing: Doing, input: CallInput): Done {
  return change(doing, input.ref, "case.call", (tx, caller, row) => {
    if (row.state !== "held") {
      throw fault("conflict", "The call was not saved. Somebody confirmed this case before it arrived.");
    }
    if (input.calledClass && !hasClass(tx, caller.shopId, input.calledClass)) {
      throw fault("invalid", "That class is not in this shop's library.", { calledClass: "Choose another class." });
    }
    addCall(tx, caller, {
      caseId: row.id,
      round: row.round,
      kind: "further",
      classSlug: input.calledClass,
      sure: input.sure,
    });
    writeCaseText(tx, caller.shopId, row.id);
  });
}

export function confirm(doing: Doing, input: Confirmation): Done {
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => {
    confirmCase(tx, caller, row, input);
    announceConfirmed(tx, { shopId: caller.shopId, caseId: row.id, now: doing.now });
  });
}

export function release(doing: Doing, input: { ref: string; why: string }): Done {
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => {
    releaseCase(tx, caller, row, input.why);
    announceConfirmed(tx, { shopId: caller.shopId, caseId: row.id, now: doing.now });
  });
}

export function tick(doing: Doing, input: { ref: string; stepId: number; spentMinutes: number }): Done {
  return change(doing, input.ref, "card.work", (tx, caller, row) => tickStep(tx, caller, row, input));
}

export function outcome(doing: Doing, input: OutcomeInput): Done {
  return change(doing, input.ref, "card.work", (tx, caller, row) => {
    recordOutcome(tx, caller, row, input);
    if (input.outcome !== "sound") announceHeldCase(tx, { shopId: caller.shopId, now: doing.now });
  });
}

export function dispose(
  doing: Doing,
  input: { ref: string; disposition: "scrap" | "concession" | "regrade"; why: string },
): Done {
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => disposeCase(tx, caller, row, input));
}

export function takeConfirmationBack(doing: Doing, input: { ref: string; why: string }): Done {
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => takeBack(tx, caller, row, input.why));
}

export function reopen(doing: Doing, input: { ref: string; why: string }): Done {
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => {
    reopenCase(tx, caller, row, input.why);
    announceHeldCase(tx, { shopId: caller.shopId, now: doing.now });
  });
}

export function amend(doing: Doing, input: Amendment): Done {
  return change(doing, input.ref, "case.amend", (tx, caller, row) => amendCase(tx, caller, row, input));
}

/** Money hangs on it, so it takes both: the second look, and sight of a case's money. */
export function planStrip(doing: Doing, input: StripChoice): Done {
  if (!can(doing.member, "money.case")) throw fault("refused", refusalWords("money.case"));
  return change(doing, input.ref, "case.confirm", (tx, caller, row) => chooseStrip(tx, caller, row, input.method));
}
