import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { ROLES, type Role } from "@/lib/cases/case-words";
import { reach } from "@/lib/permissions";
import { readSource, sourceFiles } from "@/tests/arch/source-files";
import type { TestShop } from "@/tests/fixtures/shop-factory";
import type { Ending, Entry } from "./entries";
import { copyOf, currentDb, fingerprint, makeWorld, now, type World } from "./world";

vi.mock("@/db/client", () => ({ getDb: () => currentDb() }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => now.member }));
vi.mock("@/lib/server/forget-session", () => ({ forgetSession: async () => undefined }));
vi.mock("next/cache", () => ({ revalidatePath: () => undefined }));
vi.mock("next/navigation", () => ({
  redirect: () => {
    throw new Error("REDIRECTED");
  },
}));

/** Entries that nobody signs in for, each tested where it lives. */
const OPEN_ENTRIES = [
  "app/(auth)/actions.ts askForReset",
  "app/(auth)/actions.ts setNewPassword",
  "app/(auth)/actions.ts joinCrew",
  "app/api/auth/[...nextauth]/route.ts",
  "app/api/uploadthing/route.ts",
  "app/api/ingest/[key]/route.ts",
  "app/api/health/route.ts",
];

const home = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-refusals-"));
vi.stubEnv("UPLOADS_DIR", home);
vi.stubEnv("NEXTAUTH_URL", "http://localhost:3000");
const { ENTRIES } = await import("./entries");

let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
beforeEach(() => {
  now.db = copyOf(world);
  now.member = null;
});
afterAll(() => fs.rmSync(home, { recursive: true }));

const memberOf = (role: Role, shop: TestShop) => shop.members[role];
/** Somebody of the shop who is not that role's member. */
const somebodyElse = (role: Role, shop: TestShop) =>
  role === "plater" ? shop.members.otherPlater : shop.members.plater;

interface Aimed {
  role: Role | null;
  shop: TestShop;
  mine: boolean;
}

/** Aims the entry at a row, calls it as that person, and says how it ended and whether anything changed. */
async function attempt(
  entry: Entry,
  { role, shop, mine }: Aimed,
): Promise<{ ended: Ending | "redirected"; changed: boolean }> {
  const db = currentDb();
  const by = role === null ? shop.members.plater : mine ? memberOf(role, shop) : somebodyElse(role, shop);
  const call = entry.prepare({ db, shop, by });
  now.member = role === null ? null : memberOf(role, world.mine);
  const before = fingerprint(db);
  const ended = await call().catch((error: Error) => {
    if (error.message === "REDIRECTED") return "redirected" as const;
    throw error;
  });
  return { ended, changed: fingerprint(db) !== before };
}

const reachOf = (role: Role, entry: Entry) => reach([role], entry.permission);
const cells = ENTRIES.flatMap((entry) =>
  ROLES.map((role) => ({ entry, role, name: entry.name, far: reachOf(role, entry) })),
);

describe("the table of entries", () => {
  it("holds every action and every route of the app", () => {
    const actions = sourceFiles("app")
      .filter((file) => /^\s*"use server"/.test(readSource(file)))
      .flatMap((file) => [...readSource(file).matchAll(/^export const (\w+)/gm)].map(([, name]) => `${file} ${name}`));
    const routes = sourceFiles("app")
      .filter((file) => file.endsWith("/route.ts") && !OPEN_ENTRIES.includes(file))
      .flatMap((file) =>
        [...readSource(file).matchAll(/^export const (GET|POST|PUT|PATCH|DELETE)\b/gm)].map(
          ([, name]) => `${file} ${name}`,
        ),
      );
    const known = [...ENTRIES.map((entry) => entry.name), ...OPEN_ENTRIES];
    expect([...actions, ...routes].filter((name) => !known.includes(name))).toEqual([]);
    expect(ENTRIES.map((entry) => entry.name).filter((name) => ![...actions, ...routes].includes(name))).toEqual([]);
  });
});

describe("signed out", () => {
  it.each(ENTRIES)("nobody gets through: $name", async (entry) => {
    expect(await attempt(entry, { role: null, shop: world.mine, mine: true })).toEqual({
      ended: "signed-out",
      changed: false,
    });
  });
});

describe("no cell of the matrix lets through what it refuses", () => {
  it.each(cells.filter((cell) => cell.far === "no"))("$role may not: $name", async ({ entry, role }) => {
    expect(await attempt(entry, { role, shop: world.mine, mine: true })).toEqual({ ended: "refused", changed: false });
  });

  it.each(cells.filter((cell) => cell.far === "own" && cell.entry.aims === "row"))(
    "$role not on another's row: $name",
    async ({ entry, role }) => {
      const { ended, changed } = await attempt(entry, { role, shop: world.mine, mine: false });
      expect(["refused", "not-found"]).toContain(ended);
      expect(changed).toBe(false);
    },
  );

  it.each(cells.filter((cell) => cell.far !== "no" && cell.entry.aims === "row"))(
    "$role not in another shop: $name",
    async ({ entry, role }) => {
      const { ended, changed } = await attempt(entry, { role, shop: world.other, mine: true });
      // Another shop's row is as unknown as one that never was; a snap that names one is told which field.
      expect(["not-found", "invalid"]).toContain(ended);
      expect(changed).toBe(false);
    },
  );
});

describe("every cell that allows lets through, so that the refusals above refuse for the right reason", () => {
  it.each(cells.filter((cell) => cell.far !== "no"))("$role may: $name", async ({ entry, role }) => {
    const { ended } = await attempt(entry, { role, shop: world.mine, mine: true });
    expect(["ok", "redirected"]).toContain(ended);
  });
});
