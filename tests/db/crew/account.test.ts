import { beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { getSignedIn, type SignedIn } from "@/db/queries/crew";
import { listMailRefusals } from "@/db/queries/mail-choices";
import { changePassword, chooseMails, renameSelf, signOutEverywhere } from "@/lib/server/crew/account";
import { insertMember, insertShop, TEST_NOW, TEST_PASSWORD } from "@/tests/fixtures/crew-factory";

const NEW_PASSWORD = "a fresh one for july";
let db: Db;
let member: SignedIn;

beforeEach(async () => {
  db = openDatabase(":memory:");
  member = await insertMember(db, { shopId: insertShop(db), roles: ["plater"], name: "Tobias" });
});

const change = (currentPassword: string, password = NEW_PASSWORD, now = TEST_NOW) =>
  changePassword(db, member, { currentPassword, password }, now);
const actions = () => listAudit(db, member.shopId, { limit: 10 }).entries.map((entry) => entry.action);

describe("one's own account", () => {
  it("takes a new password against the current one and ends every session", async () => {
    await change(TEST_PASSWORD);
    expect(getSignedIn(db, member.memberId, 1)).toBeNull();
    expect(getSignedIn(db, member.memberId, 2)?.name).toBe("Tobias");
    expect(actions()).toEqual(["account.password"]);
  });

  it("refuses a wrong current password beside its field, and changes nothing", async () => {
    await expect(change("wrong")).rejects.toMatchObject({ fault: { fields: { currentPassword: expect.any(String) } } });
    expect(getSignedIn(db, member.memberId, 1)?.name).toBe("Tobias");
    expect(actions()).toEqual([]);
  });

  it("refuses the same password again and a weak one", async () => {
    await expect(change(TEST_PASSWORD, TEST_PASSWORD)).rejects.toMatchObject({ fault: { code: "invalid" } });
    await expect(change(TEST_PASSWORD, "short")).rejects.toMatchObject({ fault: { code: "invalid" } });
  });

  it("stops guessing at the current password after eight tries", async () => {
    for (let i = 0; i < 8; i += 1) await expect(change("wrong")).rejects.toMatchObject({ fault: { code: "invalid" } });
    await expect(change(TEST_PASSWORD)).rejects.toMatchObject({ fault: { code: "too-many" } });
    await change(TEST_PASSWORD, NEW_PASSWORD, TEST_NOW + 15 * 60_000);
    expect(getSignedIn(db, member.memberId, 2)?.name).toBe("Tobias");
  });

  it("signs out everywhere", () => {
    signOutEverywhere(db, member, TEST_NOW);
    expect(getSignedIn(db, member.memberId, 1)).toBeNull();
    expect(actions()).toEqual(["account.signed-out-everywhere"]);
  });

  it("changes one's own name, and the trail keeps the old one", () => {
    renameSelf(db, member, "Tobias Lindqvist", TEST_NOW);
    expect(getSignedIn(db, member.memberId, 1)?.name).toBe("Tobias Lindqvist");
    const [entry] = listAudit(db, member.shopId, { limit: 1 }).entries;
    expect(entry?.detail).toEqual({ from: "Tobias", to: "Tobias Lindqvist" });
  });

  it("keeps the mails that are ticked and turns the others off", () => {
    chooseMails(db, member, ["case-confirmed"]);
    expect(listMailRefusals(db, member.shopId, member.memberId)).toEqual(["second-look-waits"]);
    chooseMails(db, member, ["case-confirmed", "second-look-waits"]);
    expect(listMailRefusals(db, member.shopId, member.memberId)).toEqual([]);
  });
});
