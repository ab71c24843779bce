import { createHash } from "node:crypto";
import { count, eq, inArray, ne, and } from "drizzle-orm";
import { bringCostsUpToDate } from "@/db/changes/bring-costs-up-to-date";
import type { Db, Handle } from "@/db/open";
import { insertMember } from "@/db/queries/crew-changes";
import { cases, exemplars, photos, shops } from "@/db/schema";
import { insertCustomer, insertJob, insertRates } from "@/db/seed/factories/insert-job";
import { insertShelf } from "@/db/seed/factories/insert-shelf";
import { insertStripRows } from "@/db/changes/insert-strip-rows";
import { shelf } from "@/db/seed/library/shelf";
import { seededRandom, type Random } from "@/db/seed/photos/random";
import { STARTING_RATES } from "@/lib/costs/starting-rates";
import { DEMO_PASSWORD, DEMO_SHOPS, DEMO_SIGN_INS } from "@/lib/crew/demo-sign-ins";
import { hashPassword } from "@/lib/server/passwords";
import { DEMO_JOBS } from "./demo-jobs";
import { seedLine } from "./demo-line";
import { shotsOf, storeShots, type Shot } from "./demo-photos";
import { planCases } from "./demo-plan";
import { playPractice } from "./demo-practice";
import { playCase, type DemoStage } from "./demo-play";

const DAY_MS = 86_400_000;
const SOURCE = "demo rates, invented; metal prices from memory";

export interface DemoOptions {
  now: number;
  uploads: string;
  /** Closed cases of the first shop. */
  closed: number;
  /** Width of the rendered photos, px. */
  photoWidth: number;
  say: (words: string) => void;
}

/**
 * Makes the two demo shops with crew, line, library, jobs and cases. Does nothing where they stand already.
 * @throws Error in a database that holds a real shop: demo data never mixes with work
 */
export async function seedDemo(db: Db, options: DemoOptions): Promise<void> {
  const slugs = DEMO_SHOPS.map((shop) => shop.slug);
  const real = db.select({ shops: count() }).from(shops).where(ne(shops.isDemo, true)).get();
  if (real && real.shops > 0)
    throw new Error("This database holds a real shop. Demo data goes only into a database of its own: set DATA_DIR.");
  const there = db
    .select({ shops: count() })
    .from(shops)
    .where(and(eq(shops.isDemo, true), inArray(shops.slug, slugs)))
    .get();
  if (there && there.shops === slugs.length) {
    bringCostsUpToDate(db, options.now);
    return options.say("The demo shops are in place.");
  }

  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const shots = db.transaction(
    (tx) =>
      DEMO_SHOPS.flatMap((shop, index) => {
        const closed = index === 0 ? options.closed : Math.min(6, options.closed);
        return seedShop(tx, { ...options, ...shop, passwordHash, seed: 7 + index, closed });
      }),
    { behavior: "immediate" },
  );
  options.say(`Cases are in. Rendering ${shots.length} photos.`);
  await storeShots(db, options.uploads, shots, (done) => {
    if (done % 50 === 0) options.say(`${done} of ${shots.length} photos`);
  });
  db.transaction((tx) => chooseExemplars(tx));
  const shop = db
    .select({ id: shops.id })
    .from(shops)
    .where(eq(shops.slug, DEMO_SHOPS[0]?.slug ?? ""))
    .get();
  if (shop) db.transaction((tx) => playPractice(tx, shop.id, options.now));
  bringCostsUpToDate(db, options.now);
}

interface DemoShopOptions {
  slug: string;
  name: string;
  passwordHash: string;
  seed: number;
  closed: number;
  now: number;
  photoWidth: number;
}

function seedShop(tx: Handle, options: DemoShopOptions): Shot[] {
  const { slug, name, now, seed } = options;
  const random = seededRandom(seed);
  const timeZone = "Europe/Stockholm";
  const { id: shopId } = tx
    .insert(shops)
    .values({ slug, name, timeZone, currency: "USD", isDemo: true, createdAt: now - 130 * DAY_MS })
    .returning({ id: shops.id })
    .get();
  const crew = seedCrew(tx, { shopId, slug, passwordHash: options.passwordHash, now });
  insertShelf(tx, shopId, shelf, now - 130 * DAY_MS);
  insertStripRows(tx, shopId, now - 130 * DAY_MS);
  insertRates(tx, shopId, now - 130 * DAY_MS, { ...STARTING_RATES, source: SOURCE });
  insertRates(tx, shopId, now - 40 * DAY_MS, { ...STARTING_RATES, labourCentsPerHour: 5500, source: SOURCE });
  const { stationIds, solutions } = seedLine(tx, { shopId, seniorId: crew.senior, now, random });
  const stage: DemoStage = {
    shopId,
    timeZone,
    now,
    crew,
    jobIds: seedJobs(tx, shopId, now),
    stationIds,
    solutions,
    random,
    uuid: uuidFrom(slug, random),
  };
  return planCases(random, now, options.closed, solutions).flatMap((plan, index) =>
    shotsOf(shopId, playCase(tx, stage, plan, index + 1), options.photoWidth),
  );
}

function seedCrew(tx: Handle, shop: { shopId: number; slug: string; passwordHash: string; now: number }) {
  const people = DEMO_SIGN_INS.filter((person) => person.shopSlug === shop.slug);
  const ids = people.map(({ email, name, roles }) => ({
    roles,
    id: insertMember(tx, {
      shopId: shop.shopId,
      email,
      name,
      roles,
      passwordHash: shop.passwordHash,
      now: shop.now - 129 * DAY_MS,
    }),
  }));
  const withRole = (role: (typeof ids)[number]["roles"][number]) => {
    // Somebody with that one role, rather than somebody who has it beside others.
    const found =
      ids.find((each) => each.roles.length === 1 && each.roles[0] === role) ??
      ids.find((each) => each.roles.includes(role));
    return (found ?? ids[0])?.id ?? 0;
  };
  const platers = ids.filter((each) => each.roles.includes("plater")).map((each) => each.id);
  const [first = withRole("plater"), second = first] = platers;
  const trainee = ids.some((each) => each.roles.includes("trainee")) ? withRole("trainee") : first;
  return { platers: [first, second] as [number, number], trainee, senior: withRole("senior") };
}

function seedJobs(tx: Handle, shopId: number, now: number): Map<string, number> {
  return new Map(
    DEMO_JOBS.map(({ customer, shape: _shape, weight: _weight, method: _method, ...job }, index) => {
      const customerId = insertCustomer(tx, shopId, customer);
      return [job.number, insertJob(tx, { ...job, shopId, customerId, openedAt: now - (100 - index) * DAY_MS })];
    }),
  );
}

/** The phone's numbers, but the same at every seeding. */
function uuidFrom(slug: string, random: Random): () => string {
  return () => {
    const hex = createHash("sha256").update(`${slug}:${random()}`).digest("hex");
    return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
  };
}

/** The first two photos of each class in each shop show it. */
function chooseExemplars(tx: Handle): void {
  const rows = tx
    .select({
      photoId: photos.id,
      shopId: photos.shopId,
      classSlug: cases.confirmedClass,
      by: cases.confirmedById,
      at: cases.confirmedAt,
    })
    .from(photos)
    .innerJoin(cases, eq(cases.id, photos.caseId))
    .where(
      and(eq(photos.purpose, "suspect"), eq(photos.state, "ready"), eq(photos.position, 0), eq(cases.state, "closed")),
    )
    .orderBy(photos.shopId, cases.id)
    .all();
  const chosen = new Map<string, number>();
  for (const { photoId, shopId, classSlug, by, at } of rows) {
    if (!classSlug || !by || !at) continue;
    const key = `${shopId}:${classSlug}`;
    const have = chosen.get(key) ?? 0;
    if (have >= 3) continue;
    chosen.set(key, have + 1);
    tx.insert(exemplars).values({ shopId, classSlug, photoId, chosenById: by, at }).onConflictDoNothing().run();
  }
}
