import { CheckField } from "@/components/ui/check-field";
import { ROLE_TITLES, ROLES, type Role } from "@/lib/cases/case-words";
import { fieldFault, type ActState } from "@/lib/act-state";

const ROLE_HINTS: Record<Role, string> = {
  plater: "Snaps suspect parts, does the rework cards",
  trainee: "Snaps and calls, marked as a trainee's",
  senior: "Takes the second look, keeps the library",
  owner: "Money, rates, crew and audit",
};

export interface RolePicksProps {
  state: ActState<void>;
  /** The roles that hold now. */
  roles: readonly Role[];
}

/** One tick box a role; a person may hold several. After a refusal it shows what was ticked. */
export function RolePicks({ state, roles }: RolePicksProps) {
  const typed = state && !state.ok ? (state.values.roles ?? []) : roles;
  const error = fieldFault(state, "roles");
  return (
    <fieldset>
      <legend className="field__label">Roles</legend>
      {ROLES.map((role) => (
        <CheckField
          key={`${role}-${typed.includes(role)}`}
          name="roles[]"
          value={role}
          label={ROLE_TITLES[role]}
          hint={ROLE_HINTS[role]}
          defaultChecked={typed.includes(role)}
          aria-invalid={error ? true : undefined}
        />
      ))}
      {error && <p className="field__error">{error}</p>}
    </fieldset>
  );
}
