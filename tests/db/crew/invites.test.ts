import { beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { listCrew, type SignedIn } from "@/db/queries/crew";
import { listPendingInvites } from "@/db/queries/invites";
import { invites, jobs, outbox } from "@/db/schema";
import { acceptInvite, invite, inviteAgain, revokeInvite } from "@/lib/server/crew/invites";
import { removeMember } from "@/lib/server/crew/members";
import { trySignIn } from "@/lib/server/crew/sign-in";
import { insertMember, insertShop, TEST_NOW } from "@/tests/fixtures/crew-factory";
import { lastToken } from "./last-token";

const DAY_MS = 86_400_000;
const INES = { email: "ines@shop.example", name: "Ines", roles: ["senior" as const, "plater" as const] };
const PASSWORD = "rinse twice and look";
let db: Db;
let shopId: number;
let owner: SignedIn;

beforeEach(async () => {
  db = openDatabase(":memory:");
  shopId = insertShop(db);
  owner = await insertMember(db, { shopId, roles: ["owner"], name: "Ruth" });
});

const accept = (token: string, now = TEST_NOW, password = PASSWORD) =>
  acceptInvite(db, { token, name: "Ines Varga", password }, now);
const crewNames = () => listCrew(db, shopId).map((member) => member.name);

describe("an invite", () => {
  it("brings the person in with the roles that the owner chose, and they can sign in", async () => {
    invite(db, owner, INES, TEST_NOW);
    await accept(lastToken(db));
    expect(listCrew(db, shopId)).toMatchObject([{ name: "Ines Varga", roles: ["plater", "senior"] }, { name: "Ruth" }]);
    const tried = { email: INES.email, password: PASSWORD, address: "10.0.0.1", now: TEST_NOW };
    expect(await trySignIn(db, tried)).toMatchObject({ kind: "in" });
    const actions = listAudit(db, shopId, { limit: 10 }).entries.map((entry) => [entry.memberName, entry.action]);
    expect(actions).toEqual([
      ["Ines Varga", "member.joined"],
      ["Ruth", "member.invited"],
    ]);
  });

  it("is mailed by a job, and its token is stored nowhere but in the mail", () => {
    invite(db, owner, INES, TEST_NOW);
    expect(db.select().from(jobs).all()).toMatchObject([{ kind: "send-mail", state: "waiting" }]);
    const token = lastToken(db);
    // 32 bytes in base64url without padding are 43 characters (RFC 4648).
    expect(token).toMatch(/^[\w-]{43}$/);
    expect(JSON.stringify(db.select().from(invites).all())).not.toContain(token);
  });

  it("works once", async () => {
    invite(db, owner, INES, TEST_NOW);
    const token = lastToken(db);
    await accept(token);
    await expect(accept(token)).rejects.toMatchObject({ fault: { code: "not-found" } });
  });

  it("makes one member when it is sent twice at the same moment", async () => {
    invite(db, owner, INES, TEST_NOW);
    const token = lastToken(db);
    const results = await Promise.allSettled([accept(token), accept(token)]);
    expect(results.map((result) => result.status).sort()).toEqual(["fulfilled", "rejected"]);
    expect(crewNames()).toEqual(["Ines Varga", "Ruth"]);
  });

  it("works until seven days are over and not after", async () => {
    invite(db, owner, INES, TEST_NOW);
    const token = lastToken(db);
    await expect(accept(token, TEST_NOW + 7 * DAY_MS)).rejects.toMatchObject({ fault: { code: "not-found" } });
    await accept(token, TEST_NOW + 7 * DAY_MS - 1);
    expect(crewNames()).toEqual(["Ines Varga", "Ruth"]);
  });

  it("stops working when it is taken back", async () => {
    invite(db, owner, INES, TEST_NOW);
    const pending = listPendingInvites(db, shopId)[0];
    revokeInvite(db, owner, pending?.id ?? 0, TEST_NOW);
    await expect(accept(lastToken(db))).rejects.toMatchObject({ fault: { code: "not-found" } });
    expect(listPendingInvites(db, shopId)).toEqual([]);
  });

  it("stops working when a newer one is sent", async () => {
    invite(db, owner, INES, TEST_NOW);
    const old = lastToken(db);
    inviteAgain(db, owner, listPendingInvites(db, shopId)[0]?.id ?? 0, TEST_NOW + DAY_MS);
    await expect(accept(old)).rejects.toMatchObject({ fault: { code: "not-found" } });
    await accept(lastToken(db), TEST_NOW + 8 * DAY_MS - 1);
    expect(crewNames()).toEqual(["Ines Varga", "Ruth"]);
  });

  it("refuses a weak password beside its field and stays open", async () => {
    invite(db, owner, INES, TEST_NOW);
    const token = lastToken(db);
    await expect(accept(token, TEST_NOW, "too short")).rejects.toMatchObject({
      fault: { code: "invalid", fields: { password: expect.stringContaining("12") } },
    });
    await accept(token);
    expect(crewNames()).toEqual(["Ines Varga", "Ruth"]);
  });

  it("is refused for somebody who is in the crew already", async () => {
    await insertMember(db, { shopId, roles: ["plater"], email: INES.email });
    expect(() => invite(db, owner, INES, TEST_NOW)).toThrow("in the crew already");
    expect(db.select().from(outbox).all()).toEqual([]);
  });

  it("does not tell the owner who works in another shop, and changes nothing there", async () => {
    const other = insertShop(db);
    await insertMember(db, { shopId: other, roles: ["owner"], email: INES.email, name: "Elsewhere" });
    invite(db, owner, INES, TEST_NOW);
    await expect(accept(lastToken(db))).rejects.toMatchObject({ fault: { code: "conflict" } });
    expect(listCrew(db, other)).toMatchObject([{ name: "Elsewhere", roles: ["owner"] }]);
    expect(crewNames()).toEqual(["Ruth"]);
  });

  it("takes a removed member back as the same person", async () => {
    const before = await insertMember(db, { shopId, roles: ["plater"], email: INES.email });
    removeMember(db, owner, before.memberId, TEST_NOW);
    invite(db, owner, INES, TEST_NOW);
    expect(await accept(lastToken(db))).toBe(before.memberId);
    expect(listCrew(db, shopId)[0]).toMatchObject({ memberId: before.memberId, roles: ["plater", "senior"] });
  });

  it("cannot be taken back or sent again by another shop's owner", async () => {
    invite(db, owner, INES, TEST_NOW);
    const stranger = await insertMember(db, { shopId: insertShop(db), roles: ["owner"] });
    const id = listPendingInvites(db, shopId)[0]?.id ?? 0;
    expect(() => revokeInvite(db, stranger, id, TEST_NOW)).toThrow("That invite is gone");
    expect(() => inviteAgain(db, stranger, id, TEST_NOW)).toThrow("That invite is gone");
    expect(listPendingInvites(db, shopId)).toHaveLength(1);
  });
});
