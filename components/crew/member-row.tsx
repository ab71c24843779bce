"use client";

import { useActionState } from "react";
import { SubmitButton } from "@/components/ui/submit-button";
import { ROLE_TITLES, type Role } from "@/lib/cases/case-words";
import type { FormAction } from "./form-action";
import { FormAnswer } from "./form-answer";
import { RolePicks } from "./role-picks";
import styles from "./crew-list.module.css";

export interface MemberRowProps {
  member: { memberId: number; name: string; email: string; roles: readonly Role[] };
  isSelf: boolean;
  onChangeRoles: FormAction;
  onRemove: FormAction;
}

/** One person of the crew; what may be changed about them opens beneath. */
export function MemberRow({ member, isSelf, onChangeRoles, onRemove }: MemberRowProps) {
  return (
    <li>
      <div className={styles.head}>
        <strong>
          {member.name}
          {isSelf && <span className="quiet"> (you)</span>}
        </strong>
        <span className="small quiet">{member.email}</span>
      </div>
      <p className="small">{member.roles.map((role) => ROLE_TITLES[role]).join(", ")}</p>
      <details>
        <summary className={styles.summary}>
          Change<span className="sr-only"> {member.name}</span>
        </summary>
        <div className={styles.change}>
          <RolesForm member={member} action={onChangeRoles} />
          <RemoveForm member={member} action={onRemove} />
        </div>
      </details>
    </li>
  );
}

function RolesForm({ member, action }: { member: MemberRowProps["member"]; action: FormAction }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <input type="hidden" name="memberId" value={member.memberId} />
      <RolePicks state={state} roles={member.roles} />
      <FormAnswer state={state} done={{ title: "Roles changed", words: "They hold from the person's next page on." }} />
      <div>
        <SubmitButton>Save the roles</SubmitButton>
      </div>
    </form>
  );
}

function RemoveForm({ member, action }: { member: MemberRowProps["member"]; action: FormAction }) {
  const [state, send] = useActionState(action, null);
  return (
    <form className="form" action={send}>
      <input type="hidden" name="memberId" value={member.memberId} />
      <p className="small">Removing signs {member.name} out at once. What they did stays in every history.</p>
      <FormAnswer state={state} />
      <div>
        <SubmitButton variant="hold">Remove {member.name}</SubmitButton>
      </div>
    </form>
  );
}
