import { ROLE_TITLES, type Role } from "@/lib/cases/case-words";
import styles from "./sign-in-form.module.css";

export interface DemoGroup {
  shopName: string;
  people: readonly { email: string; name: string; roles: readonly Role[] }[];
}

export interface DemoSignInsProps {
  groups: readonly DemoGroup[];
  password: string;
  /** Fills the form in with that person. */
  onPick: (email: string) => void;
}

/** Who can sign in to the invented shops. Shown only where such a shop is in the database. */
export function DemoSignIns({ groups, password, onPick }: DemoSignInsProps) {
  return (
    <section className={styles.demo} aria-label="Demo sign-ins">
      <p className="small">
        This database holds two invented shops. Everybody&rsquo;s password is <code className="mono">{password}</code>.
        Press a name to fill it in.
      </p>
      {groups.map((group) => (
        <div key={group.shopName}>
          <h2>{group.shopName}</h2>
          <ul>
            {group.people.map((person) => (
              <li key={person.email}>
                <button type="button" className={styles.person} onClick={() => onPick(person.email)}>
                  <span>{person.name}</span>
                  <span className="small quiet">{person.roles.map((role) => ROLE_TITLES[role]).join(", ")}</span>
                </button>
              </li>
            ))}
          </ul>
        </div>
      ))}
    </section>
  );
}
