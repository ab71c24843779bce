import { beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { listAudit } from "@/db/queries/audit";
import { getSignedIn, listCrew, type SignedIn } from "@/db/queries/crew";
import { FaultError } from "@/lib/fault";
import { changeRoles, removeMember } from "@/lib/server/crew/members";
import { insertMember, insertShop, TEST_NOW } from "@/tests/fixtures/crew-factory";

let db: Db;
let shopId: number;
let owner: SignedIn;
let plater: SignedIn;

beforeEach(async () => {
  db = openDatabase(":memory:");
  shopId = insertShop(db);
  owner = await insertMember(db, { shopId, roles: ["owner"], name: "Ruth" });
  plater = await insertMember(db, { shopId, roles: ["plater"], name: "Tobias" });
});

const rolesOf = (memberId: number) => listCrew(db, shopId).find((member) => member.memberId === memberId)?.roles;
const audit = () => listAudit(db, shopId, { limit: 10 }).entries;

/** The code of the fault that a call ends in; fails the test when it ends well. */
function faultCode(call: () => void): string {
  try {
    call();
  } catch (error) {
    if (error instanceof FaultError) return error.fault.code;
    throw error;
  }
  throw new Error("The call was not refused.");
}

describe("changing roles", () => {
  it("gives several roles, written down with who changed what from what", () => {
    changeRoles(db, owner, { memberId: plater.memberId, roles: ["plater", "senior"] }, TEST_NOW);
    expect(getSignedIn(db, plater.memberId, 1)?.roles).toEqual(["plater", "senior"]);
    expect(audit()).toMatchObject([
      {
        memberName: "Ruth",
        action: "member.roles",
        subject: "Tobias",
        detail: { from: ["plater"], to: ["plater", "senior"] },
      },
    ]);
  });

  it("never leaves the shop without an owner", () => {
    expect(faultCode(() => changeRoles(db, owner, { memberId: owner.memberId, roles: ["senior"] }, TEST_NOW))).toBe(
      "conflict",
    );
    expect(rolesOf(owner.memberId)).toEqual(["owner"]);
    expect(audit()).toEqual([]);
  });

  it("lets an owner step down once another one is there", () => {
    changeRoles(db, owner, { memberId: plater.memberId, roles: ["owner"] }, TEST_NOW);
    changeRoles(db, owner, { memberId: owner.memberId, roles: ["senior"] }, TEST_NOW);
    expect(rolesOf(owner.memberId)).toEqual(["senior"]);
  });

  it("does not count a removed owner, nor one of another shop, as an owner who is left", async () => {
    const second = await insertMember(db, { shopId, roles: ["owner"] });
    removeMember(db, owner, second.memberId, TEST_NOW);
    await insertMember(db, { shopId: insertShop(db), roles: ["owner"] });
    expect(faultCode(() => removeMember(db, owner, owner.memberId, TEST_NOW))).toBe("conflict");
  });

  it("does not reach another shop's member", async () => {
    const stranger = await insertMember(db, { shopId: insertShop(db), roles: ["plater"] });
    const input = { memberId: stranger.memberId, roles: ["owner" as const] };
    expect(faultCode(() => changeRoles(db, owner, input, TEST_NOW))).toBe("not-found");
    expect(faultCode(() => removeMember(db, owner, stranger.memberId, TEST_NOW))).toBe("not-found");
    expect(getSignedIn(db, stranger.memberId, 1)?.roles).toEqual(["plater"]);
    expect(audit()).toEqual([]);
  });
});

describe("removing a member", () => {
  it("ends their session at the next request and takes them off the list, with an entry", () => {
    removeMember(db, owner, plater.memberId, TEST_NOW);
    expect(getSignedIn(db, plater.memberId, 1)).toBeNull();
    expect(listCrew(db, shopId).map((member) => member.name)).toEqual(["Ruth"]);
    expect(audit()).toMatchObject([{ action: "member.removed", subject: "Tobias" }]);
  });

  it("says so when somebody else was faster", () => {
    removeMember(db, owner, plater.memberId, TEST_NOW);
    expect(faultCode(() => removeMember(db, owner, plater.memberId, TEST_NOW))).toBe("not-found");
  });
});
