import { beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { getSignedIn, type SignedIn } from "@/db/queries/crew";
import { markMemberRemoved } from "@/db/queries/crew-changes";
import { outbox, passwordResets } from "@/db/schema";
import { requestPasswordReset, resetPassword } from "@/lib/server/crew/password-resets";
import { trySignIn } from "@/lib/server/crew/sign-in";
import { insertMember, insertShop, TEST_NOW, TEST_PASSWORD } from "@/tests/fixtures/crew-factory";
import { lastToken } from "./last-token";

const HOUR_MS = 3_600_000;
const EMAIL = "tobias@shop.example";
const NEW_PASSWORD = "a fresh one for july";
let db: Db;
let tobias: SignedIn;

beforeEach(async () => {
  db = openDatabase(":memory:");
  tobias = await insertMember(db, { shopId: insertShop(db), roles: ["plater"], email: EMAIL });
});

const signIn = (password: string) => trySignIn(db, { email: EMAIL, password, address: "10.0.0.1", now: TEST_NOW });
const mails = () => db.select().from(outbox).all();
const reset = (token: string, now = TEST_NOW) => resetPassword(db, { token, password: NEW_PASSWORD }, now);

describe("a forgotten password", () => {
  it("is replaced by a mailed link; the old one and every old session end", async () => {
    requestPasswordReset(db, EMAIL, TEST_NOW);
    await reset(lastToken(db));
    expect(await signIn(TEST_PASSWORD)).toEqual({ kind: "wrong" });
    expect(await signIn(NEW_PASSWORD)).toMatchObject({ kind: "in", sessionVersion: 2 });
    expect(getSignedIn(db, tobias.memberId, 1)).toBeNull();
  });

  it("mails nobody for an unknown e-mail or a removed member, and does not say so", () => {
    markMemberRemoved(db, tobias.shopId, tobias.memberId, TEST_NOW);
    expect(requestPasswordReset(db, "nobody@shop.example", TEST_NOW)).toBeUndefined();
    expect(requestPasswordReset(db, EMAIL, TEST_NOW)).toBeUndefined();
    expect(mails()).toEqual([]);
  });

  it("is reset by a link once, within an hour", async () => {
    requestPasswordReset(db, EMAIL, TEST_NOW);
    const token = lastToken(db);
    await expect(reset(token, TEST_NOW + HOUR_MS)).rejects.toMatchObject({ fault: { code: "not-found" } });
    await reset(token, TEST_NOW + HOUR_MS - 1);
    await expect(reset(token)).rejects.toMatchObject({ fault: { code: "not-found" } });
  });

  it("closes every other open link of the same person", async () => {
    requestPasswordReset(db, EMAIL, TEST_NOW);
    const first = lastToken(db);
    requestPasswordReset(db, EMAIL, TEST_NOW + 1);
    await reset(lastToken(db), TEST_NOW + 2);
    await expect(reset(first, TEST_NOW + 3)).rejects.toMatchObject({ fault: { code: "not-found" } });
  });

  it("mails three links an hour and no more", () => {
    for (let i = 0; i < 5; i += 1) requestPasswordReset(db, EMAIL, TEST_NOW + i);
    expect(mails()).toHaveLength(3);
    requestPasswordReset(db, EMAIL, TEST_NOW + HOUR_MS);
    expect(mails()).toHaveLength(4);
  });

  it("cannot be reset for somebody who was removed after asking", async () => {
    requestPasswordReset(db, EMAIL, TEST_NOW);
    const token = lastToken(db);
    markMemberRemoved(db, tobias.shopId, tobias.memberId, TEST_NOW);
    await expect(reset(token)).rejects.toMatchObject({ fault: { code: "not-found" } });
  });

  it("lets a person in whom too many tries had shut out", async () => {
    for (let i = 0; i < 9; i += 1) await signIn("wrong");
    requestPasswordReset(db, EMAIL, TEST_NOW);
    await reset(lastToken(db));
    expect(await signIn(NEW_PASSWORD)).toMatchObject({ kind: "in" });
  });

  it("keeps the token nowhere but in the mail, and refuses a weak password", async () => {
    requestPasswordReset(db, EMAIL, TEST_NOW);
    const token = lastToken(db);
    expect(JSON.stringify(db.select().from(passwordResets).all())).not.toContain(token);
    const weak = resetPassword(db, { token, password: "password1234" }, TEST_NOW);
    await expect(weak).rejects.toMatchObject({ fault: { code: "invalid", fields: { password: expect.any(String) } } });
    await reset(token);
  });
});
