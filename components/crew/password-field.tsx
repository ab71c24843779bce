"use client";

import { useState } from "react";
import { FieldFrame } from "@/components/ui/field-wiring";
import styles from "./password-field.module.css";

export interface PasswordFieldProps {
  label: string;
  name: string;
  autoComplete: "current-password" | "new-password";
  hint?: string;
  error?: string;
  minLength?: number;
}

/** A password, with a button that shows it: gloves and small keys make slips that dots hide. */
export function PasswordField({ label, hint, error, ...native }: PasswordFieldProps) {
  const [isShown, setShown] = useState(false);
  return (
    <FieldFrame words={{ label, hint, error }}>
      {(wiring) => (
        <span className={`field__box ${styles.box}`}>
          <input
            {...native}
            {...wiring}
            type={isShown ? "text" : "password"}
            required
            maxLength={256}
            spellCheck={false}
          />
          <button type="button" className={styles.show} onClick={() => setShown(!isShown)}>
            {isShown ? "Hide" : "Show"}
            <span className="sr-only"> {label.toLowerCase()}</span>
          </button>
        </span>
      )}
    </FieldFrame>
  );
}
