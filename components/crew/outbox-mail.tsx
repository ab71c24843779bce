import { textParts } from "@/lib/crew/mail-text";
import styles from "./outbox-mail.module.css";

export interface OutboxMailProps {
  subject: string;
  toEmail: string;
  whenWords: string;
  /** "sent …" or "lies here". */
  stateWords: string;
  /** Null: the words hold a secret that is only for its reader. */
  text: string | null;
  isOpen: boolean;
}

/** One message as its reader gets it; its links work. */
export function OutboxMailView({ subject, toEmail, whenWords, stateWords, text, isOpen }: OutboxMailProps) {
  return (
    <li className={styles.mail}>
      <div className={styles.head}>
        <strong>{subject}</strong>
        <span className="small quiet">{stateWords}</span>
      </div>
      <p className="small quiet">
        To {toEmail}, {whenWords}
      </p>
      {text === null ? (
        <p className="small">Its link is only for its reader.</p>
      ) : (
        <details open={isOpen}>
          <summary className={styles.summary}>
            Read it<span className="sr-only">: {subject}</span>
          </summary>
          <div className={styles.body}>
            {textParts(text).map((part, index) =>
              part.kind === "link" ? (
                <a key={index} href={part.href}>
                  {part.href}
                </a>
              ) : (
                part.words
              ),
            )}
          </div>
        </details>
      )}
    </li>
  );
}
