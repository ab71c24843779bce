import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { and, eq } from "drizzle-orm";
import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { getEntry, listShelf } from "@/db/queries/library-entries";
import { getLibraryMark } from "@/db/queries/library";
import { getLibraryClass } from "@/db/queries/library-class";
import { listDrafts, listRevisions } from "@/db/queries/library-revisions";
import { countUses } from "@/db/queries/library-uses";
import { listSnapChoices } from "@/db/queries/snap-choices";
import { auditEntries, exemplars, libraryRevisions } from "@/db/schema";
import { shelf } from "@/db/seed/library/shelf";
import { FaultError } from "@/lib/fault";
import type { SaveEntry } from "@/lib/library/entry-edit.schema";
import type { DraftBody, EntryKind } from "@/lib/library/entry-kinds";
import type { LibraryClass } from "@/lib/library/library-entry";
import { bringIn, setAgainst } from "@/lib/server/library/bring-in";
import { dropDraft, saveEntry, settleEntry } from "@/lib/server/library/edit-entry";
import { bringBack, removeEntry } from "@/lib/server/library/remove-entry";
import { librarySearchFor } from "@/lib/server/library/search-index";
import { readyPhoto } from "@/tests/app/refusals/targets";
import { copyOf, makeWorld, type World } from "@/tests/app/refusals/world";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import { confirmFor, makeCase, type TestShop } from "@/tests/fixtures/shop-factory";

vi.mock("server-only", () => ({}));

let db: Db;
let shop: TestShop;
let ines: SignedIn;
let ruth: SignedIn;
let now = TEST_NOW;
let world: World;
beforeAll(async () => {
  world = await makeWorld();
});
beforeEach(() => {
  db = copyOf(world);
  shop = world.mine;
  ines = shop.members.senior;
  ruth = shop.members.owner;
  now = TEST_NOW;
});

const CAUSE = "cleaner-spent";
const live = (kind: EntryKind, slug: string): DraftBody => ({ ...getEntry(db, shop.shopId, kind, slug) });
const input = (over: Partial<SaveEntry>): SaveEntry => ({
  entry: "cause",
  slug: CAUSE,
  baseRevision: 1,
  note: "",
  intent: "publish",
  newCitation: "",
  newKind: "published",
  body: live("cause", CAUSE),
  ...over,
});
const save = (member: SignedIn, over: Partial<SaveEntry>) => saveEntry(db, member, input(over), (now += 60_000));
const rows = (kind: EntryKind, slug: string) => listRevisions(db, shop.shopId, kind, slug);

function faultOf(run: () => unknown) {
  try {
    run();
  } catch (error) {
    if (error instanceof FaultError) return error.fault;
    throw error;
  }
  throw new Error("Nothing was refused.");
}

const SMOKY: DraftBody = {
  title: "Smoky edges",
  short: "Grey smoke along the edges.",
  atStrike: "A grey veil.",
  inFinalPlate: "Dull nickel.",
  tells: [{ versus: "burning", tell: "Burning is powdery; smoke wipes to a stain." }],
  checks: [],
  prevention: [],
  stripNote: "Polish it back.",
  otherLikelihood: 0,
  synonyms: ["smokey rim"],
  sourceKeys: ["from-memory"],
};
const saveClass = (over: Partial<SaveEntry> = {}) =>
  save(ines, { entry: "class", slug: null, baseRevision: 0, body: SMOKY, ...over });

describe("draft and publish", () => {
  it("a draft changes nothing that others read, and every save of it is a row", () => {
    const mark = getLibraryMark(db, shop.shopId);
    save(ines, { intent: "draft", body: { ...live("cause", CAUSE), why: "Draft one." } });
    save(ines, { intent: "draft", body: { ...live("cause", CAUSE), why: "" } });
    expect(getEntry(db, shop.shopId, "cause", CAUSE)).toEqual(shelf.causes.find((each) => each.slug === CAUSE));
    expect(getLibraryMark(db, shop.shopId)).toBe(mark);
    expect(rows("cause", CAUSE).map((row) => [row.state, row.body.why])).toEqual([
      ["draft", ""],
      ["draft", "Draft one."],
      ["published", shelf.causes.find((each) => each.slug === CAUSE)?.why],
    ]);
  });

  it("publishing shows at once: page, search, revision, audit trail, and the draft waits no more", () => {
    save(ines, { intent: "draft", body: { ...live("cause", CAUSE), synonyms: ["zonked soap"] } });
    expect(librarySearchFor(db, shop.shopId)("zonked")).toEqual([]);
    const body = { ...live("cause", CAUSE), synonyms: ["zonked soap"], classSlugs: ["oxidation", "dewetting"] };
    expect(save(ines, { body, note: "Our word" })).toMatchObject({ published: 2 });
    expect(librarySearchFor(db, shop.shopId)("zonked soap")[0]).toMatchObject({ slug: CAUSE });
    expect(getLibraryClass(db, shop.shopId, "oxidation")?.causes.map((cause) => cause.slug)).toContain(CAUSE);
    expect(getEntry(db, shop.shopId, "cause", CAUSE)?.classSlugs).toEqual(["oxidation", "dewetting"]);
    expect(listDrafts(db, shop.shopId)).toEqual([]);
    const audit = db.select().from(auditEntries).where(eq(auditEntries.action, "library.published")).all();
    expect(audit).toMatchObject([{ memberId: ines.memberId, detail: { revision: 2, why: "Our word" } }]);
  });

  it("nothing half written is published, and a fix keeps its place among its cause's fixes", () => {
    const bad = faultOf(() => save(ines, { body: { ...live("cause", CAUSE), why: " " } }));
    expect(bad).toMatchObject({ code: "invalid", fields: { why: expect.any(String) as string } });
    const gone = faultOf(() => save(ines, { body: { ...live("cause", CAUSE), classSlugs: ["no-such"] } }));
    expect(gone.fields?.classSlugs).toContain("no-such");
    const fix = shelf.fixes[0];
    const order = () => listShelf(db, shop.shopId).fixes.map((each) => each.slug);
    const before = order();
    save(ines, {
      entry: "fix",
      slug: fix?.slug ?? "",
      body: { ...live("fix", fix?.slug ?? ""), whenNot: "Never on Sundays." },
    });
    expect(order()).toEqual(before);
    expect(getEntry(db, shop.shopId, "fix", fix?.slug ?? "")).toEqual({ ...fix, whenNot: "Never on Sundays." });
  });

  it("a source typed beside an entry joins the shop's list and stands under the entry", () => {
    save(ines, { newCitation: "Works manual of 1987, page 12", intent: "draft" });
    const own = listDrafts(db, shop.shopId)[0];
    expect(own?.body.sourceKeys).toContain("works-manual-of-1987-page-12");
    expect(getEntry(db, shop.shopId, "source", "works-manual-of-1987-page-12")?.citation).toContain("1987");
  });

  it("two editors' drafts of one entry stand side by side; dropping one leaves the other", () => {
    save(ines, { intent: "draft" });
    save(ruth, { intent: "draft" });
    expect(listDrafts(db, shop.shopId).map((draft) => draft.memberId)).toEqual([ruth.memberId, ines.memberId]);
    dropDraft(db, ines, { entry: "cause", slug: CAUSE }, now);
    expect(listDrafts(db, shop.shopId).map((draft) => draft.memberId)).toEqual([ruth.memberId]);
    expect(rows("cause", CAUSE)).toHaveLength(4);
  });
});

describe("two editors at once", () => {
  const begun = () => live("cause", CAUSE);

  it("who comes second is told, keeps what was typed, and publishes on top with both one's words in", () => {
    const both = begun();
    save(ines, { body: { ...both, why: "Ines says why.", proof: "Ines proves." } });
    const told = faultOf(() => save(ruth, { body: { ...both, why: "Ruth says why.", synonyms: ["ruthless soap"] } }));
    expect(told.code).toBe("conflict");
    expect(told.message).toContain(ines.name);
    const draft = listDrafts(db, shop.shopId, { entry: "cause", slug: CAUSE })[0];
    expect(draft).toMatchObject({ memberId: ruth.memberId, baseRevision: 1, body: { why: "Ruth says why." } });
    const settle = {
      entry: "cause" as const,
      slug: CAUSE,
      draftId: draft?.id ?? 0,
      theirRevision: 2,
      note: "",
      intent: "publish" as const,
    };
    const open = faultOf(() => settleEntry(db, ruth, { ...settle, choices: {} }, now));
    expect(Object.keys(open.fields ?? {})).toEqual(["choice.why"]);
    settleEntry(db, ruth, { ...settle, choices: { why: "both" } }, now);
    expect(getEntry(db, shop.shopId, "cause", CAUSE)).toMatchObject({
      why: "Ines says why.\n\nRuth says why.",
      proof: "Ines proves.",
      synonyms: ["ruthless soap"],
    });
    expect(rows("cause", CAUSE).map((row) => row.state)).toEqual(["published", "draft", "published", "published"]);
  });

  it("a third who publishes while the second chooses is seen too, and nobody settles another's draft", () => {
    const both = begun();
    save(ines, { body: { ...both, why: "Ines says why." } });
    faultOf(() => save(ruth, { body: { ...both, why: "Ruth says why." } }));
    const draft = listDrafts(db, shop.shopId)[0];
    const settle = {
      entry: "cause" as const,
      slug: CAUSE,
      draftId: draft?.id ?? 0,
      note: "",
      intent: "publish" as const,
      choices: { why: "mine" as const },
    };
    save(ines, { baseRevision: 2, body: { ...both, why: "Ines once more." } });
    expect(faultOf(() => settleEntry(db, ruth, { ...settle, theirRevision: 2 }, now)).code).toBe("conflict");
    expect(faultOf(() => settleEntry(db, ines, { ...settle, theirRevision: 3 }, now)).code).toBe("not-found");
    expect(settleEntry(db, ruth, { ...settle, theirRevision: 3 }, now).published).toBe(4);
  });
});

describe("an entry of the shop's own", () => {
  it("can be called at the snap as soon as it is published, under a slug that nothing else has", () => {
    expect(saveClass({ intent: "draft" }).slug).toBe("smoky-edges");
    expect(listSnapChoices(db, shop.shopId).classes.map((each) => each.slug)).not.toContain("smoky-edges");
    expect(saveClass().slug).toBe("smoky-edges-2");
    expect(listSnapChoices(db, shop.shopId).classes.at(-1)).toEqual({ slug: "smoky-edges-2", title: "Smoky edges" });
    expect(saveClass({ body: { ...SMOKY, title: "Peeling" } }).slug).toBe("peeling-2");
    expect(saveClass({ body: { ...SMOKY, title: "Metals" } }).slug).toBe("metals-2");
    makeCase(db, shop, { calledClass: "smoky-edges-2" });
    expect(countUses(db, shop.shopId, "class", "smoky-edges-2")).toMatchObject({ cases: 1, calls: 1 });
  });
});

describe("removing", () => {
  const remove = (entry: EntryKind, slug: string, baseRevision = 1) =>
    removeEntry(db, ines, { entry, slug, baseRevision, note: "" }, now);

  it("is refused with what points at it, and how much of it", () => {
    confirmFor(db, shop, makeCase(db, shop));
    const told = faultOf(() => remove("class", "underactivation"));
    expect(told.code).toBe("conflict");
    expect(told.message).toContain("1 case stands under it");
    expect(told.message).toMatch(/\d+ causes show as it/);
    expect(faultOf(() => remove("class", "sound")).message).toContain("Sound");
    const used = shelf.fixes.find((fix) => fix.causeSlugs.length > 0)?.causeSlugs[0] ?? "";
    expect(faultOf(() => remove("cause", used)).message).toMatch(/fix(es)? puts? it right/);
  });

  it("counts exemplars, whatever the case stands under", () => {
    saveClass();
    const { photoId } = readyPhoto(
      { db, shop, by: shop.members.plater },
      fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-edit-")),
    );
    db.insert(exemplars)
      .values({ shopId: shop.shopId, classSlug: "smoky-edges", photoId, chosenById: ines.memberId, at: now })
      .run();
    expect(faultOf(() => remove("class", "smoky-edges")).message).toContain("1 photo shows it as an exemplar");
  });

  it("takes the entry out, keeps its words, and brings it back as a new revision", () => {
    saveClass();
    const mark = getLibraryMark(db, shop.shopId);
    expect(librarySearchFor(db, shop.shopId)("smokey rim")[0]?.slug).toBe("smoky-edges");
    remove("class", "smoky-edges");
    expect(getEntry(db, shop.shopId, "class", "smoky-edges")).toBeNull();
    expect(getLibraryMark(db, shop.shopId)).not.toBe(mark);
    expect(librarySearchFor(db, shop.shopId)("smokey rim").map((hit) => hit.slug)).not.toContain("smoky-edges");
    const removed = rows("class", "smoky-edges")[0];
    expect(removed).toMatchObject({ state: "removed", revision: 2, body: { title: "Smoky edges" } });
    const back = { entry: "class" as const, slug: "smoky-edges", baseRevision: 0, revisionId: removed?.id ?? 0 };
    expect(bringBack(db, ruth, back, now).published).toBe(3);
    expect(getEntry(db, shop.shopId, "class", "smoky-edges")).toMatchObject(SMOKY);
  });
});

describe("bringing an earlier revision back", () => {
  it("publishes a copy on top, and is refused once somebody published since the page was opened", () => {
    const first = rows("cause", CAUSE)[0]?.id ?? 0;
    const was = live("cause", CAUSE);
    save(ines, { body: { ...was, why: "Ines says why." } });
    const back = { entry: "cause" as const, slug: CAUSE, revisionId: first };
    expect(faultOf(() => bringBack(db, ruth, { ...back, baseRevision: 1 }, now)).code).toBe("conflict");
    expect(bringBack(db, ruth, { ...back, baseRevision: 2 }, now).published).toBe(3);
    expect(live("cause", CAUSE)).toEqual(was);
    expect(rows("cause", CAUSE)).toHaveLength(3);
  });
});

describe("bringing a file in", () => {
  const fileOf = () =>
    JSON.stringify({
      format: "coppertell-library",
      version: 1,
      shop: "Other",
      exportedAt: "2026-12-01T10:00:00Z",
      ...changed(),
    });
  const changed = () => ({
    ...shelf,
    causes: shelf.causes.map((cause) => (cause.slug === CAUSE ? { ...cause, why: "The other shop's why." } : cause)),
    classes: [
      ...shelf.classes,
      { ...(SMOKY as unknown as LibraryClass), slug: "smoky-edges", position: 40, sourceKeys: ["their-book"] },
    ],
    sources: [...shelf.sources, { key: "their-book", kind: "published" as const, citation: "Their book" }],
  });
  const pick = (kind: EntryKind, slug: string, seenRevision: number) => ({ kind, slug, seenRevision });

  it("publishes what is chosen, with the sources that it needs, and touches nothing else", () => {
    const text = fileOf();
    const answer = bringIn(
      db,
      ines,
      { from: "file", text, as: "publish", pick: [pick("class", "smoky-edges", 0)] },
      now,
    );
    expect(answer).toEqual({ published: 1, drafts: 0, overtaken: [] });
    const { classes, sources, causes, fixes } = listShelf(db, shop.shopId);
    expect(classes).toHaveLength(shelf.classes.length + 1);
    expect(classes.at(-1)).toMatchObject({ slug: "smoky-edges", position: shelf.classes.length });
    expect(sources.at(-1)?.key).toBe("their-book");
    expect([causes, fixes]).toEqual([shelf.causes, shelf.fixes]);
  });

  it("lays entries as drafts on request, and what was published meanwhile in any case", () => {
    const text = fileOf();
    const both = [pick("class", "smoky-edges", 0), pick("cause", CAUSE, 1)];
    save(ruth, { body: { ...live("cause", CAUSE), why: "Ruth was first." } });
    const answer = bringIn(db, ines, { from: "file", text, as: "publish", pick: both }, now);
    expect(answer).toMatchObject({
      published: 1,
      overtaken: [shelf.causes.find((each) => each.slug === CAUSE)?.title],
    });
    expect(live("cause", CAUSE).why).toBe("Ruth was first.");
    expect(listDrafts(db, shop.shopId)).toMatchObject([
      { slug: CAUSE, baseRevision: 1, body: { why: "The other shop's why." } },
    ]);
  });

  it("publishes nothing that would point at nothing", () => {
    const cause = shelf.causes[0];
    const own = {
      ...shelf,
      causes: [{ ...cause, slug: "fume", classSlugs: ["smoky-edges"] }],
      classes: changed().classes,
    };
    const text = JSON.stringify({
      format: "coppertell-library",
      version: 1,
      shop: "O",
      exportedAt: "2026-12-01T10:00:00Z",
      ...own,
      sources: changed().sources,
    });
    const told = faultOf(() =>
      bringIn(db, ines, { from: "file", text, as: "publish", pick: [pick("cause", "fume", 0)] }, now),
    );
    expect(told).toMatchObject({ code: "invalid" });
    expect(told.fields?.pick).toContain("smoky-edges");
    const asDraft = bringIn(db, ines, { from: "file", text, as: "drafts", pick: [pick("cause", "fume", 0)] }, now);
    expect(asDraft.drafts).toBe(1);
  });

  it("gives a shop that was opened earlier what the shelf has gained", () => {
    const lacking = shelf.fixes.at(-1)?.slug ?? "";
    removeEntry(db, ines, { entry: "fix", slug: lacking, baseRevision: 1, note: "" }, now);
    expect(setAgainst(db, shop.shopId, shelf).filter((entry) => entry.standing !== "same")).toMatchObject([
      { kind: "fix", slug: lacking, standing: "new", revision: 0 },
    ]);
    bringIn(db, ines, { from: "shelf", text: "", as: "publish", pick: [pick("fix", lacking, 0)] }, now);
    expect(setAgainst(db, shop.shopId, shelf).every((entry) => entry.standing === "same")).toBe(true);
  });
});

it("no edit reaches the library of another shop", () => {
  const { other } = world;
  const before = JSON.stringify(listShelf(db, other.shopId));
  save(ines, { body: { ...live("cause", CAUSE), why: "Ours." } });
  saveClass();
  expect(JSON.stringify(listShelf(db, other.shopId))).toBe(before);
  const theirs = db
    .select()
    .from(libraryRevisions)
    .where(and(eq(libraryRevisions.shopId, other.shopId), eq(libraryRevisions.slug, CAUSE)))
    .all();
  expect(theirs).toHaveLength(1);
});
