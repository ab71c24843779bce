import { eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import type { Db } from "@/db/open";
import { markMemberRemoved } from "@/db/queries/crew-changes";
import { cases, jobs, outbox } from "@/db/schema";
import { chooseMails } from "@/lib/server/crew/account";
import { announceConfirmed } from "@/lib/server/mail/announce-confirmed";
import { announceHeldCase } from "@/lib/server/mail/announce-held";
import { secondLookDigestJob } from "@/lib/server/mail/second-look-digest";
import { insertShop } from "@/tests/fixtures/crew-factory";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const MINUTE_MS = 60_000;
/** 10:00 UTC sharp, the beginning of a ten-minute span. */
const TEN = Date.UTC(2026, 6, 6, 10);
let db: Db;
let shop: TestShop;

beforeEach(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
});

const hold = (now: number) => {
  const held = makeCase(db, shop, { now });
  announceHeldCase(db, { shopId: shop.shopId, now });
  return held.ref;
};
const digests = () => db.select().from(jobs).where(eq(jobs.kind, "second-look-digest")).all();
const run = (now: number) => secondLookDigestJob(db, { shopId: shop.shopId }, now);
const mailsTo = (email: string) => db.select().from(outbox).where(eq(outbox.toEmail, email)).all();

describe("'waits for your second look'", () => {
  it("goes out once for all parts held within the same ten minutes, when these are over", () => {
    const refs = [hold(TEN + MINUTE_MS), hold(TEN + 9 * MINUTE_MS)];
    expect(digests().map((job) => job.runAfterAt)).toEqual([TEN + 10 * MINUTE_MS]);
    run(TEN + 10 * MINUTE_MS);
    for (const person of [shop.members.senior, shop.members.owner]) {
      const mails = mailsTo(person.email);
      expect(mails).toHaveLength(1);
      for (const ref of refs) expect(mails[0]?.text).toContain(`/cases/${ref}/second-look`);
    }
  });

  it("goes only to those who take the second look and want it", () => {
    chooseMails(db, shop.members.owner, []);
    hold(TEN);
    run(TEN + 10 * MINUTE_MS);
    expect(
      db
        .select()
        .from(outbox)
        .all()
        .map((mail) => mail.toEmail),
    ).toEqual([shop.members.senior.email]);
  });

  it("names each part once, however often it runs", () => {
    const first = hold(TEN);
    run(TEN + 10 * MINUTE_MS);
    run(TEN + 10 * MINUTE_MS);
    const second = hold(TEN + 11 * MINUTE_MS);
    run(TEN + 20 * MINUTE_MS);
    const texts = mailsTo(shop.members.senior.email).map((mail) => [
      mail.text.includes(first),
      mail.text.includes(second),
    ]);
    expect(texts).toEqual([
      [true, false],
      [false, true],
    ]);
  });

  it("waits until ten minutes have passed since the last one when the worker was late", () => {
    hold(TEN);
    run(TEN + 18 * MINUTE_MS);
    hold(TEN + 19 * MINUTE_MS);
    run(TEN + 20 * MINUTE_MS);
    expect(mailsTo(shop.members.senior.email)).toHaveLength(1);
    expect(digests().at(-1)?.runAfterAt).toBe(TEN + 28 * MINUTE_MS);
    run(TEN + 28 * MINUTE_MS);
    expect(mailsTo(shop.members.senior.email)).toHaveLength(2);
  });

  it("is not sent for parts that were looked at meanwhile", () => {
    const held = makeCase(db, shop, { now: TEN });
    confirmFor(db, shop, held, {}, TEN + MINUTE_MS);
    run(TEN + 10 * MINUTE_MS);
    expect(db.select().from(outbox).all()).toEqual([]);
  });

  it("says nothing to another shop", async () => {
    const other = await makeShop(db);
    hold(TEN);
    run(TEN + 10 * MINUTE_MS);
    secondLookDigestJob(db, { shopId: other.shopId }, TEN + 10 * MINUTE_MS);
    expect(mailsTo(other.members.senior.email)).toEqual([]);
  });
});

describe("'your part was confirmed'", () => {
  const announce = (caseId: number, shopId = shop.shopId) => announceConfirmed(db, { caseId, shopId, now: TEN });
  const confirmed = () => confirmFor(db, shop, makeCase(db, shop, { now: TEN - MINUTE_MS }), {}, TEN);

  it("tells the person who opened the case the class and the disposition", () => {
    const row = confirmed();
    announce(row.id);
    const [mail] = mailsTo(shop.members.plater.email);
    expect(mail?.subject).toBe(`${row.ref} is confirmed: Underactivation`);
    expect(mail?.text).toContain(`Disposition: Rework.`);
    expect(mail?.text).toContain(`/cases/${row.ref}\n`);
  });

  it("is not sent to a senior who confirmed their own snap", () => {
    const held = makeCase(db, shop, { now: TEN - MINUTE_MS, by: shop.members.senior });
    announce(confirmFor(db, shop, held, {}, TEN).id);
    expect(db.select().from(outbox).all()).toEqual([]);
  });

  it("is not sent to who refused it or has left", () => {
    chooseMails(db, shop.members.plater, []);
    announce(confirmed().id);
    chooseMails(db, shop.members.plater, ["case-confirmed"]);
    markMemberRemoved(db, shop.shopId, shop.members.plater.memberId, TEN);
    announce(confirmed().id);
    expect(db.select().from(outbox).all()).toEqual([]);
  });

  it("does not reach into another shop", () => {
    announce(confirmed().id, insertShop(db));
    expect(db.select().from(cases).all()).toHaveLength(1);
    expect(db.select().from(outbox).all()).toEqual([]);
  });
});
