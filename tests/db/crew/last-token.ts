import { desc } from "drizzle-orm";
import type { Db } from "@/db/open";
import { outbox } from "@/db/schema";

/** The secret of the newest mailed link, read from the mail as its reader would. */
export function lastToken(db: Db): string {
  const mail = db.select({ text: outbox.text }).from(outbox).orderBy(desc(outbox.id)).limit(1).get();
  const token = /\/(?:invite|reset-password)\/([\w-]+)\n/.exec(mail?.text ?? "")?.[1];
  if (token === undefined) throw new Error("The newest mail holds no link.");
  return token;
}
