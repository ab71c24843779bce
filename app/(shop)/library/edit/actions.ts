"use server";

import {
  bringBackInput,
  dropDraftInput,
  removeEntryInput,
  saveEntryInput,
  settleEntryInput,
} from "@/lib/library/entry-edit.schema";
import { routes } from "@/lib/routes";
import { act } from "@/lib/server/act";
import * as editing from "@/lib/server/library/edit-entry";
import * as removing from "@/lib/server/library/remove-entry";

/** Whatever shows words of the library. */
const showing = () => [routes.library(), routes.audit()];

/** A published entry shows the page that it changed; a draft comes back to its form. */
const after = ({ entry, slug, published }: editing.KeptEntry) =>
  published === null
    ? routes.libraryEdit(entry, slug, { kept: "draft" })
    : routes.libraryRevisions(entry, slug, { published: String(published) });

export const saveEntry = act({
  permission: "library.edit",
  input: saveEntryInput,
  run: ({ db, member, input, now }) => editing.saveEntry(db, member, input, now),
  revalidate: showing,
  next: after,
});

export const settleEntry = act({
  permission: "library.edit",
  input: settleEntryInput,
  run: ({ db, member, input, now }) => editing.settleEntry(db, member, input, now),
  revalidate: showing,
  next: after,
});

export const dropDraft = act({
  permission: "library.edit",
  input: dropDraftInput,
  run: ({ db, member, input, now }) => editing.dropDraft(db, member, input, now),
  revalidate: showing,
  next: () => routes.library(),
});

export const bringBack = act({
  permission: "library.edit",
  input: bringBackInput,
  run: ({ db, member, input, now }) => removing.bringBack(db, member, input, now),
  revalidate: showing,
  next: after,
});

export const removeEntry = act({
  permission: "library.edit",
  input: removeEntryInput,
  run: ({ db, member, input, now }) => removing.removeEntry(db, member, input, now),
  revalidate: showing,
  next: ({ entry, slug }) => routes.libraryRevisions(entry, slug),
});
