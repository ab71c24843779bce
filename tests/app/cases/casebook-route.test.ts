import { NextRequest } from "next/server";
import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const signedIn: { db: Db | null; member: SignedIn | null } = { db: null, member: null };
vi.mock("@/db/client", () => ({ getDb: () => signedIn.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => signedIn.member }));
vi.stubEnv("NEXTAUTH_URL", "http://localhost:3000");
const { GET } = await import("@/app/api/cases/route");

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeAll(async () => {
  db = emptyDatabase();
  shop = await makeShop(db);
  other = await makeShop(db);
  confirmFor(db, shop, makeCase(db, shop, { note: "Black smut at the rim." }));
  for (let index = 0; index < 29; index += 1) makeCase(db, shop, { calledClass: "peeling", note: "" });
  makeCase(db, other, { note: "Smut." });
  signedIn.db = db;
});
beforeEach(() => {
  signedIn.member = shop.members.senior;
});

interface Answer {
  status: number;
  type: string | null;
  body: { cases: Record<string, unknown>[]; nextCursor: string | null; fields?: Record<string, string> };
}

async function ask(query: string): Promise<Answer> {
  const answer = await GET(new NextRequest(`http://localhost:3000/api/cases${query}`), { params: Promise.resolve({}) });
  // The route's own shape, checked field by field below.
  const body = (await answer.json()) as Answer["body"];
  return { status: answer.status, type: answer.headers.get("content-type"), body };
}

describe("GET /api/cases", () => {
  it("hands out all of the shop's cases page by page, each once", async () => {
    const first = await ask("");
    const second = await ask(`?cursor=${first.body.nextCursor}`);
    const refs = [...first.body.cases, ...second.body.cases].map((each) => each.ref);
    expect(new Set(refs).size).toBe(30);
    expect(refs).toHaveLength(30);
    expect(second.body.nextCursor).toBeNull();
  });

  it("narrows by class, state and words together", async () => {
    expect((await ask("?class=underactivation&status=confirmed&q=smutt")).body.cases).toMatchObject([
      { class: "underactivation", state: "confirmed", note: "Black smut at the rim." },
    ]);
    expect((await ask("?class=peeling&status=closed")).body).toMatchObject({ cases: [], nextCursor: null });
  });

  it("tells money to those who may see it and to nobody else", async () => {
    expect((await ask("")).body.cases[0]).toHaveProperty("costCents");
    for (const member of [shop.members.plater, shop.members.trainee]) {
      signedIn.member = member;
      expect(JSON.stringify((await ask("")).body)).not.toMatch(/cost|cents/i);
    }
  });

  it.each([
    ["?cursor=yesterday", "cursor"],
    ["?status=lost", "status"],
    ["?class=gremlins", "class"],
    ["?by=424242", "by"],
    ["?closedFrom=2026-02-30", "closedFrom"],
    ["?q=smut&cursor=o5-7", "cursor"],
  ])("refuses %s as a problem that names %s", async (query, field) => {
    const { status, type, body } = await ask(query);
    expect(status).toBe(400);
    // RFC 9457, section 3.
    expect(type).toBe("application/problem+json");
    expect(Object.keys(body.fields ?? {})).toEqual([field]);
  });

  it("knows no row of another shop, not even as a filter", async () => {
    const theirs = other.members.plater.memberId;
    expect((await ask(`?by=${theirs}`)).status).toBe(400);
    expect((await ask("?q=smut")).body.cases).toHaveLength(1);
  });
});
