import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { jobs, outbox } from "@/db/schema";
import { queueMail } from "@/lib/server/mail/queue-mail";
import { sendMailJob } from "@/lib/server/mail/send-mail-job";
import { insertShop, TEST_NOW } from "@/tests/fixtures/crew-factory";
import { startSmtp, type TestSmtp } from "@/tests/fixtures/smtp-server";

const LATER = TEST_NOW + 5000;
const here = { MAIL_FROM: "Coppertell <no-reply@shop.example>", NEXTAUTH_URL: "https://shop.example" };
let db: Db;
let shopId: number;
let smtp: TestSmtp | undefined;

beforeEach(() => {
  db = openDatabase(":memory:");
  shopId = insertShop(db);
});

afterEach(async () => {
  await smtp?.close();
  smtp = undefined;
});

/** Queues a mail and returns what its job carries. */
function queue(kind: "invite" | "case-confirmed" = "case-confirmed"): Record<string, string | number> {
  const words = { subject: "Re-strike: ready", text: "Öppna\nhttps://shop.example/x\n", html: "<p>Öppna</p>" };
  db.transaction((tx) => queueMail(tx, { shopId, kind, toEmail: "ines@shop.example", ...words, now: TEST_NOW }));
  const job = db.select().from(jobs).all().at(-1);
  if (!job) throw new Error("No job was written.");
  return job.payload;
}

const row = () => db.select().from(outbox).get();

describe("mail", () => {
  it("stays in the outbox without SMTP_URL, and the job is done", async () => {
    await sendMailJob(db, queue(), LATER, { ...here, SMTP_URL: undefined });
    expect(row()).toMatchObject({ sentAt: null, subject: "Re-strike: ready" });
  });

  it("is sent once SMTP_URL is set, with its subject, sender and words", async () => {
    smtp = await startSmtp();
    await sendMailJob(db, queue(), LATER, { ...here, SMTP_URL: smtp.url });
    expect(smtp.recipients).toEqual(["ines@shop.example"]);
    expect(smtp.messages).toHaveLength(1);
    const message = smtp.messages[0] ?? "";
    expect(message).toContain("Subject: Re-strike: ready");
    expect(message).toContain("From: Coppertell <no-reply@shop.example>");
    // "Ö" in quoted-printable UTF-8: RFC 2045.
    expect(message).toContain("=C3=96ppna");
    expect(message).toContain("multipart/alternative");
    expect(row()?.sentAt).toBe(LATER);
  });

  it("is not sent twice when its job runs twice", async () => {
    smtp = await startSmtp();
    const payload = queue();
    await sendMailJob(db, payload, LATER, { ...here, SMTP_URL: smtp.url });
    await sendMailJob(db, payload, LATER + 1, { ...here, SMTP_URL: smtp.url });
    expect(smtp.messages).toHaveLength(1);
    expect(row()?.sentAt).toBe(LATER);
  });

  it("stays unsent when the mail server turns it away, so that the worker tries again", async () => {
    smtp = await startSmtp({ refuse: true });
    const tried = sendMailJob(db, queue(), LATER, { ...here, SMTP_URL: smtp.url });
    await expect(tried).rejects.toThrow("550");
    expect(row()?.sentAt).toBeNull();
  });

  it("keeps no secret link in the database once the mail with it is out", async () => {
    smtp = await startSmtp();
    await sendMailJob(db, queue("invite"), LATER, { ...here, SMTP_URL: smtp.url });
    expect(smtp.messages[0]).toContain("https://shop.example/x");
    expect(row()?.text).not.toContain("https://");
    expect(row()?.html).not.toContain("ppna");
  });

  it("does not send another shop's row", async () => {
    smtp = await startSmtp();
    const payload = { ...queue(), shopId: insertShop(db) };
    await sendMailJob(db, payload, LATER, { ...here, SMTP_URL: smtp.url });
    expect(smtp.messages).toEqual([]);
    expect(row()?.sentAt).toBeNull();
  });

  it("is kept together with its job or not at all", () => {
    const broken = () =>
      db.transaction((tx) => {
        queueMail(tx, {
          shopId,
          kind: "invite",
          toEmail: "a@b.example",
          subject: "s",
          text: "t",
          html: "h",
          now: TEST_NOW,
        });
        throw new Error("the reason failed");
      });
    expect(broken).toThrow("the reason failed");
    expect([db.select().from(jobs).all(), db.select().from(outbox).all()]).toEqual([[], []]);
  });
});
