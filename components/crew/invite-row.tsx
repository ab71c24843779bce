"use client";

import { useActionState } from "react";
import { SubmitButton } from "@/components/ui/submit-button";
import { ROLE_TITLES, type Role } from "@/lib/cases/case-words";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";
import styles from "./crew-list.module.css";

export interface InviteRowProps {
  invite: { id: number; name: string; email: string; roles: readonly Role[]; invitedBy: string };
  /** "until 13 Jul 2026, 10:00", or that it has run out. */
  untilWords: string;
  onSendAgain: FormAction;
  onTakeBack: FormAction;
}

/** An invite that nobody has taken up yet. */
export function InviteRow({ invite, untilWords, onSendAgain, onTakeBack }: InviteRowProps) {
  const [again, sendAgain] = useActionState(onSendAgain, null);
  const [back, takeBack] = useActionState(onTakeBack, null);
  return (
    <li>
      <div className={styles.head}>
        <strong>{invite.name}</strong>
        <span className="small quiet">{invite.email}</span>
      </div>
      <p className="small">
        {invite.roles.map((role) => ROLE_TITLES[role]).join(", ")} · from {invite.invitedBy} · {untilWords}
      </p>
      <FormAnswer state={again} />
      <FormAnswer state={back} />
      <div className={styles.buttons}>
        <form action={sendAgain}>
          <input type="hidden" name="inviteId" value={invite.id} />
          <SubmitButton aria-label={`Send again to ${invite.name}`}>Send again</SubmitButton>
        </form>
        <form action={takeBack}>
          <input type="hidden" name="inviteId" value={invite.id} />
          <SubmitButton variant="hold" aria-label={`Take back the invite of ${invite.name}`}>
            Take it back
          </SubmitButton>
        </form>
      </div>
    </li>
  );
}
