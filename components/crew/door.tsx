import type { ReactNode } from "react";
import { StrikeScene } from "./strike-scene";
import styles from "./door.module.css";

export interface DoorProps {
  title: string;
  /** low: less picture on a phone, for pages with more to read. */
  picture?: "full" | "low";
  children: ReactNode;
}

/** What people see before they are in: sign-in, invite, password. */
export function Door({ title, picture = "low", children }: DoorProps) {
  return (
    <div className={picture === "low" ? `${styles.door} ${styles.low}` : styles.door}>
      <header className={styles.hero}>
        <div className={styles.word}>Coppertell</div>
        <div className={styles.bus} />
        <div className={styles.picture}>
          <StrikeScene className={styles.scene} />
          <p className={styles.motto}>Read the strike before the final plate goes on.</p>
        </div>
      </header>
      <main id="work" className={styles.work}>
        <h1>{title}</h1>
        <div className="stack">{children}</div>
      </main>
    </div>
  );
}
