import { NextRequest } from "next/server";
import { beforeAll, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { confirmFor, emptyDatabase, makeCase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const signedIn: { db: Db | null; member: SignedIn | null } = { db: null, member: null };
vi.mock("@/db/client", () => ({ getDb: () => signedIn.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => signedIn.member }));
vi.stubEnv("NEXTAUTH_URL", "http://localhost:3000");
const { GET } = await import("@/app/api/cases/[ref]/route");

let shop: TestShop;
let ref: string;

beforeAll(async () => {
  const db = emptyDatabase();
  shop = await makeShop(db);
  ref = confirmFor(db, shop, makeCase(db, shop)).ref;
  signedIn.db = db;
});

async function ask(member: SignedIn | null, asked: string) {
  signedIn.member = member;
  const request = new NextRequest(`http://localhost:3000/api/cases/${asked}`);
  const answer = await GET(request, { params: Promise.resolve({ ref: asked }) });
  return { status: answer.status, text: await answer.text() };
}

describe("GET /api/cases/[ref]", () => {
  it("hands out the facts, calls, history and card of a case", async () => {
    const { status, text } = await ask(shop.members.plater, ref);
    expect(status).toBe(200);
    expect(JSON.parse(text)).toMatchObject({
      ref,
      state: "confirmed",
      confirmedTitle: "Underactivation",
      calls: [{ kind: "first" }, { kind: "second-look" }],
      history: [{ event: "opened" }, { event: "confirmed" }],
      // The two steps of the test's own confirmation.
      cards: [{ steps: [{ title: "Polish the strike back" }, { title: "Strike again" }] }],
    });
  });

  it("gives no link to a photo whose file has not come in", async () => {
    const { text } = await ask(shop.members.plater, ref);
    expect(JSON.parse(text)).toMatchObject({ photos: [{ state: "awaited", url: null }] });
  });

  it.each(["plater", "trainee"] as const)("holds no money for a %s", async (role) => {
    const { text } = await ask(shop.members[role], ref);
    expect(text).not.toMatch(/cents|money|atRisk|rates/i);
  });

  it.each(["senior", "owner"] as const)("holds the money for a %s", async (role) => {
    const { text } = await ask(shop.members[role], ref);
    const body = JSON.parse(text) as { money?: { estimate: { meanCents: number } } };
    expect(body.money?.estimate.meanCents).toBeGreaterThan(0);
  });

  it("answers in words to a reference that is none, and to one that nobody has", async () => {
    expect((await ask(shop.members.plater, "nonsense")).status).toBe(400);
    expect((await ask(shop.members.plater, "CT-2001-0001")).status).toBe(404);
    expect((await ask(null, ref)).status).toBe(401);
  });
});
