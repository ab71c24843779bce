import { beforeEach, describe, expect, it, vi } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { getSignedIn } from "@/db/queries/crew";
import { markMemberRemoved, setRoles } from "@/db/queries/crew-changes";
import { members, signInAttempts } from "@/db/schema";
import { trySignIn } from "@/lib/server/crew/sign-in";
import { hashPassword, verifyPassword } from "@/lib/server/passwords";
import { insertMember, insertShop, TEST_NOW, TEST_PASSWORD } from "@/tests/fixtures/crew-factory";

// Watched, not replaced: every hash and check is real.
vi.mock("@/lib/server/passwords", { spy: true });

const MINUTE_MS = 60_000;
const RUTH = "ruth@shop.example";
let db: Db;
let shopId: number;

beforeEach(async () => {
  db = openDatabase(":memory:");
  shopId = insertShop(db);
  await insertMember(db, { shopId, roles: ["owner"], email: RUTH });
});

const tryAt = (now: number, email = RUTH, password = "wrong", address = "10.0.0.1") =>
  trySignIn(db, { email, password, address, now });

describe("signing in", () => {
  it("lets a member in with their password", async () => {
    const answer = await tryAt(TEST_NOW, RUTH, TEST_PASSWORD);
    expect(answer).toMatchObject({ kind: "in", sessionVersion: 1 });
  });

  it("answers the same for a wrong password, an unknown e-mail and a removed member", async () => {
    const gone = await insertMember(db, { shopId, roles: ["plater"], email: "gone@shop.example" });
    markMemberRemoved(db, shopId, gone.memberId, TEST_NOW);
    expect(await tryAt(TEST_NOW)).toEqual({ kind: "wrong" });
    expect(await tryAt(TEST_NOW, "nobody@shop.example")).toEqual({ kind: "wrong" });
    expect(await tryAt(TEST_NOW, "gone@shop.example", TEST_PASSWORD)).toEqual({ kind: "wrong" });
  });

  it("does the same work for an e-mail that nobody has, so that the time does not tell", async () => {
    vi.mocked(verifyPassword).mockClear();
    await tryAt(TEST_NOW, "nobody@shop.example");
    const hashes = vi.mocked(verifyPassword).mock.calls.map(([hash]) => hash.split("$").slice(1, 4).join(" "));
    // The cost that a member's own hash has, see "passwords" below.
    expect(hashes).toEqual(["argon2id v=19 m=19456,t=2,p=1"]);
  });

  it("refuses the ninth try within 15 minutes, the right password too, and says how long", async () => {
    for (let i = 0; i < 8; i += 1) await tryAt(TEST_NOW + i * MINUTE_MS);
    const ninth = await tryAt(TEST_NOW + 8 * MINUTE_MS, RUTH, TEST_PASSWORD);
    // The first try leaves the window 15 minutes after it was made, 7 minutes from now.
    expect(ninth).toEqual({ kind: "too-many", waitMs: 7 * MINUTE_MS });
    expect(await tryAt(TEST_NOW + 15 * MINUTE_MS, RUTH, TEST_PASSWORD)).toMatchObject({ kind: "in" });
  });

  it("tells a limited unknown e-mail the same as a known one", async () => {
    for (let i = 0; i < 8; i += 1) await tryAt(TEST_NOW, "nobody@shop.example");
    expect(await tryAt(TEST_NOW, "nobody@shop.example")).toEqual({ kind: "too-many", waitMs: 15 * MINUTE_MS });
  });

  it("limits tries that come at the same moment", async () => {
    const answers = await Promise.all(Array.from({ length: 12 }, () => tryAt(TEST_NOW)));
    expect(answers.filter((answer) => answer.kind === "wrong")).toHaveLength(8);
    expect(answers.filter((answer) => answer.kind === "too-many")).toHaveLength(4);
  });

  it("refuses the 41st try from one address, whatever the e-mails, and lets another address in", async () => {
    const answers = [];
    for (let i = 0; i < 41; i += 1) answers.push(await tryAt(TEST_NOW, `person${i}@shop.example`));
    expect(answers.map((answer) => answer.kind)).toEqual([...Array<string>(40).fill("wrong"), "too-many"]);
    expect(await tryAt(TEST_NOW, RUTH, TEST_PASSWORD, "10.0.0.2")).toMatchObject({ kind: "in" });
  });

  it("forgives earlier slips once the password is right", async () => {
    for (let i = 0; i < 7; i += 1) await tryAt(TEST_NOW);
    await tryAt(TEST_NOW, RUTH, TEST_PASSWORD);
    expect(
      db
        .select()
        .from(signInAttempts)
        .all()
        .filter((row) => row.key === `e:${RUTH}`),
    ).toEqual([]);
    expect(await tryAt(TEST_NOW)).toEqual({ kind: "wrong" });
  });

  it("does not let a stranger's own good sign-in wash away their tries from an address", async () => {
    for (let i = 0; i < 30; i += 1) await tryAt(TEST_NOW, `person${i}@shop.example`);
    await tryAt(TEST_NOW, RUTH, TEST_PASSWORD);
    expect(
      db
        .select()
        .from(signInAttempts)
        .all()
        .filter((row) => row.key === "i:10.0.0.1"),
    ).toHaveLength(30);
  });

  it("keeps no try for longer than it counts", async () => {
    await tryAt(TEST_NOW);
    await tryAt(TEST_NOW + 16 * MINUTE_MS, "other@shop.example");
    expect(
      db
        .select()
        .from(signInAttempts)
        .all()
        .map((row) => row.key),
    ).toEqual(["e:other@shop.example", "i:10.0.0.1"]);
  });
});

describe("passwords", () => {
  it("are kept as argon2id at the named cost, each with its own salt", async () => {
    const [one, two] = await Promise.all([hashPassword("rinse twice!"), hashPassword("rinse twice!")]);
    // PHC string: m in KiB (19 MiB = 19456), t passes, p lanes; the OWASP setting that the code names.
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(one).not.toBe(two);
  });

  it("are the same however the keyboard writes an accent", async () => {
    expect(await verifyPassword(await hashPassword("caf\u00e9 au lait!"), "cafe\u0301 au lait!")).toBe(true);
  });
});

describe("a session", () => {
  it("sees roles as they are at each request", async () => {
    const { memberId } = await insertMember(db, { shopId, roles: ["plater"] });
    setRoles(db, shopId, memberId, ["senior", "plater"]);
    expect(getSignedIn(db, memberId, 1)?.roles).toEqual(["plater", "senior"]);
  });

  it("is dead once the member is removed or the version has moved on", async () => {
    const { memberId } = await insertMember(db, { shopId, roles: ["plater"] });
    expect(getSignedIn(db, memberId, 2)).toBeNull();
    markMemberRemoved(db, shopId, memberId, TEST_NOW);
    expect(getSignedIn(db, memberId, 1)).toBeNull();
    expect(getSignedIn(db, memberId, 2)).toBeNull();
  });

  it("never holds the password hash", async () => {
    const member = await insertMember(db, { shopId, roles: ["plater"] });
    expect(JSON.stringify(member)).not.toContain("argon2");
    expect(
      db
        .select()
        .from(members)
        .all()
        .every((row) => row.passwordHash?.startsWith("$argon2id$")),
    ).toBe(true);
  });
});
