import { index, integer, sqliteTable, text, uniqueIndex } from "drizzle-orm/sqlite-core";
import { moment, ownerShopId, rowId } from "./columns";

/** Slow or outside work, written in the same transaction as its reason and done after it. */
export const jobs = sqliteTable(
  "jobs",
  {
    id: rowId(),
    shopId: ownerShopId(),
    kind: text("kind", { enum: ["photo-sizes", "send-mail", "second-look-digest"] }).notNull(),
    payload: text("payload", { mode: "json" }).$type<Record<string, string | number>>().notNull(),
    /** Two jobs with one key are one job while the first waits. */
    onceKey: text("once_key"),
    state: text("state", { enum: ["waiting", "running", "done", "failed"] })
      .notNull()
      .default("waiting"),
    attempts: integer("attempts").notNull().default(0),
    runAfterAt: moment("run_after_at").notNull(),
    startedAt: moment("started_at"),
    doneAt: moment("done_at"),
    lastError: text("last_error"),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [uniqueIndex("jobs_once").on(t.onceKey), index("jobs_due").on(t.state, t.runAfterAt, t.id)],
);

/** Every message that the shop sends: first written here, then sent where SMTP_URL says so. */
export const outbox = sqliteTable(
  "outbox",
  {
    id: rowId(),
    shopId: ownerShopId(),
    kind: text("kind", { enum: ["invite", "password-reset", "second-look-waits", "case-confirmed"] }).notNull(),
    toEmail: text("to_email").notNull(),
    subject: text("subject").notNull(),
    text: text("text").notNull(),
    html: text("html").notNull(),
    createdAt: moment("created_at").notNull(),
    /** Null while it only lies in the outbox. */
    sentAt: moment("sent_at"),
  },
  (t) => [index("outbox_shop").on(t.shopId, t.id)],
);
