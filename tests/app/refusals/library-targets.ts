import { eq } from "drizzle-orm";
import { libraryRevisions } from "@/db/schema";
import { getEntry } from "@/db/queries/library-entries";
import { shelf } from "@/db/seed/library/shelf";
import { formOfEntry, type FormValues } from "@/lib/library/entry-form";
import { LIBRARY_FORMAT } from "@/lib/library/library-file.schema";
import { saveEntry } from "@/lib/server/library/edit-entry";
import { TEST_NOW } from "@/tests/fixtures/crew-factory";
import type { Aim } from "./targets";

/** Where the editor's actions stand. */
export const EDIT = "app/(shop)/library/edit/actions.ts";

/** A class's form as the browser would send it. */
export function entryForm({ db, shop }: Aim, slug: string, head: Record<string, string>): FormData {
  const data = new FormData();
  const words = formOfEntry("class", { ...getEntry(db, shop.shopId, "class", slug) });
  const values: FormValues = { ...words, entry: "class", slug, ...head };
  for (const [name, value] of Object.entries(values)) {
    if (typeof value === "string") data.append(name, value);
    else for (const each of value) data.append(`${name}[]`, each);
  }
  return data;
}

/**
 * A class of the shop's own with two revisions, of which its editor has a draft on the first: every row of it that an
 * action of the editor may aim at. Its slug is in no other shop.
 */
export function overtakenDraft({ db, shop, by }: Aim) {
  const body = { ...getEntry(db, shop.shopId, "class", "burning"), title: `Smoke of ${by.name}`, tells: [] };
  const input = { entry: "class" as const, note: "", newCitation: "", newKind: "published" as const };
  const member = shop.members.owner;
  const { slug } = saveEntry(db, member, { ...input, slug: null, baseRevision: 0, intent: "publish", body }, TEST_NOW);
  saveEntry(db, by, { ...input, slug, baseRevision: 1, intent: "draft", body }, TEST_NOW);
  const again = { ...body, short: "Grey smoke." };
  // By a member who has no draft of it.
  const other = { ...shop.members.plater, memberId: shop.members.otherPlater.memberId };
  saveEntry(db, other, { ...input, slug, baseRevision: 1, intent: "publish", body: again }, TEST_NOW);
  const rows = db
    .select({ id: libraryRevisions.id })
    .from(libraryRevisions)
    .where(eq(libraryRevisions.slug, slug))
    .all();
  return { slug, standing: 2, firstId: rows[0]?.id ?? 0, draftId: rows[1]?.id ?? 0 };
}

/** A library file that brings one source. */
export function libraryFileText(): string {
  const source = { key: "works-manual", kind: "published", citation: "Works manual of 1987" };
  const exportedAt = "2026-12-01T10:00:00.000Z";
  return JSON.stringify({
    format: LIBRARY_FORMAT,
    version: 1,
    shop: "Quarry Lane",
    exportedAt,
    ...shelf,
    sources: [...shelf.sources, source],
  });
}
