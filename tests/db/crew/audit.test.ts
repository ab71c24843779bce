import { beforeEach, describe, expect, it } from "vitest";
import { openDatabase, type Db } from "@/db/open";
import { insertAudit, listAudit } from "@/db/queries/audit";
import { insertMember, insertShop, TEST_NOW } from "@/tests/fixtures/crew-factory";

let db: Db;
let shopId: number;

beforeEach(() => {
  db = openDatabase(":memory:");
  shopId = insertShop(db);
});

async function writeDown(shop: number, count: number): Promise<void> {
  const { memberId } = await insertMember(db, { shopId: shop, roles: ["owner"] });
  for (let i = 1; i <= count; i += 1) {
    insertAudit(db, { shopId: shop, memberId, action: "member.invited", subject: `person ${i}`, now: TEST_NOW });
  }
}

describe("the audit trail", () => {
  it("pages newest first, every entry once, also when several came at the same moment", async () => {
    await writeDown(shopId, 7);
    const seen: string[] = [];
    let beforeId: number | undefined;
    for (let page = 0; page < 3; page += 1) {
      const { entries, nextBeforeId } = listAudit(db, shopId, { beforeId, limit: 3 });
      seen.push(...entries.map((entry) => entry.subject));
      beforeId = nextBeforeId ?? undefined;
    }
    expect(seen).toEqual([7, 6, 5, 4, 3, 2, 1].map((i) => `person ${i}`));
    expect(beforeId).toBeUndefined();
  });

  it("offers no next page when the last one is exactly full", async () => {
    await writeDown(shopId, 3);
    expect(listAudit(db, shopId, { limit: 3 }).nextBeforeId).toBeNull();
  });

  it("shows nothing of another shop", async () => {
    await writeDown(insertShop(db), 2);
    expect(listAudit(db, shopId, { limit: 10 }).entries).toEqual([]);
  });

  it("cannot be changed or emptied afterwards", async () => {
    await writeDown(shopId, 1);
    expect(() => db.$client.exec("update audit_entries set subject = 'nobody'")).toThrow("append-only");
    expect(() => db.$client.exec("delete from audit_entries")).toThrow("append-only");
  });
});
