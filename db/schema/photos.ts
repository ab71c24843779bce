import { foreignKey, index, integer, primaryKey, sqliteTable, text, unique } from "drizzle-orm/sqlite-core";
import { PHOTO_PURPOSES, PHOTO_SIZES, PHOTO_STATES } from "@/lib/photos/photo-words";
import { cases } from "./cases";
import { moment, ownerShopId } from "./columns";
import { members } from "./crew";
import { libraryClasses } from "./library";

export const photos = sqliteTable(
  "photos",
  {
    /** UUID made by the phone, so that a retried upload is the same photo. */
    id: text("id").primaryKey(),
    shopId: ownerShopId(),
    /** Null while the snap it belongs to has not been sent. */
    caseId: integer("case_id"),
    round: integer("round").notNull().default(1),
    purpose: text("purpose", { enum: PHOTO_PURPOSES }).notNull(),
    position: integer("position").notNull().default(0),
    state: text("state", { enum: PHOTO_STATES }).notNull(),
    /** Why it could not be kept, in words for the person. */
    refusal: text("refusal"),
    memberId: integer("member_id").notNull(),
    fileName: text("file_name").notNull(),
    bytes: integer("bytes"),
    format: text("format"),
    width: integer("width"),
    height: integer("height"),
    /** From the camera's own record, where it had one. */
    takenAt: moment("taken_at"),
    /** Base64 of a thumb hash, drawn until the photo has loaded. */
    placeholder: text("placeholder"),
    /** Made by the demo generator, not by a camera: every screen that shows it says so. */
    isRendered: integer("is_rendered", { mode: "boolean" }).notNull().default(false),
    createdAt: moment("created_at").notNull(),
    readyAt: moment("ready_at"),
  },
  (t) => [
    unique("photos_shop_row").on(t.shopId, t.id),
    index("photos_case").on(t.shopId, t.caseId, t.round, t.position),
    index("photos_loose").on(t.shopId, t.state, t.createdAt),
    foreignKey({ columns: [t.shopId, t.caseId], foreignColumns: [cases.shopId, cases.id] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const photoSizes = sqliteTable(
  "photo_sizes",
  {
    shopId: ownerShopId(),
    photoId: text("photo_id").notNull(),
    size: text("size", { enum: PHOTO_SIZES }).notNull(),
    /** Path under the uploads folder. */
    path: text("path").notNull(),
    mime: text("mime").notNull(),
    bytes: integer("bytes").notNull(),
    width: integer("width").notNull(),
    height: integer("height").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.photoId, t.size] }),
    foreignKey({ columns: [t.shopId, t.photoId], foreignColumns: [photos.shopId, photos.id] }),
  ],
);

/** Confirmed photos that a senior chose to show a class at its clearest. */
export const exemplars = sqliteTable(
  "exemplars",
  {
    shopId: ownerShopId(),
    classSlug: text("class_slug").notNull(),
    photoId: text("photo_id").notNull(),
    chosenById: integer("chosen_by_id").notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.shopId, t.classSlug, t.photoId] }),
    foreignKey({ columns: [t.shopId, t.classSlug], foreignColumns: [libraryClasses.shopId, libraryClasses.slug] }),
    foreignKey({ columns: [t.shopId, t.photoId], foreignColumns: [photos.shopId, photos.id] }),
    foreignKey({ columns: [t.shopId, t.chosenById], foreignColumns: [members.shopId, members.id] }),
  ],
);

/** What the local stand-in of the upload service holds of a file, so that a broken upload goes on where it stopped. */
export const uploadedFiles = sqliteTable(
  "uploaded_files",
  {
    /** The photo's UUID; the service's own key is short enough to collide. */
    customId: text("custom_id").primaryKey(),
    key: text("key").notNull(),
    callback: text("callback", { mode: "json" }).$type<{ slug: string; metadata: unknown }>().notNull(),
    finishedAt: moment("finished_at"),
    createdAt: moment("created_at").notNull(),
  },
  (t) => [index("uploaded_files_key").on(t.key)],
);
