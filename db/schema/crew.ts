import {
  foreignKey,
  index,
  integer,
  primaryKey,
  sqliteTable,
  text,
  unique,
  uniqueIndex,
} from "drizzle-orm/sqlite-core";
import { ROLES } from "@/lib/cases/case-words";
import { MAIL_KINDS } from "@/lib/crew/mail-kinds";
import { moment } from "./columns";

export const shops = sqliteTable(
  "shops",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    slug: text("slug").notNull(),
    name: text("name").notNull(),
    timeZone: text("time_zone").notNull(),
    currency: text("currency").notNull(),
    units: text("units", { enum: ["metric", "us"] })
      .notNull()
      .default("metric"),
    /** True for the invented demo shops: screens say so. */
    isDemo: integer("is_demo", { mode: "boolean" }).notNull().default(false),
    /** The version of the cost estimate that the shop's cases were last priced with; see `lib/costs/cost-model.ts`. */
    costModel: integer("cost_model").notNull().default(0),
    /** Next running number per year-month lives in `case_numbers`. */
    createdAt: moment("created_at").notNull(),
  },
  (t) => [uniqueIndex("shops_slug").on(t.slug)],
);

export const members = sqliteTable(
  "members",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    shopId: integer("shop_id")
      .notNull()
      .references(() => shops.id),
    /** Lower case. One e-mail is one person in one shop. */
    email: text("email").notNull(),
    name: text("name").notNull(),
    /** Null until the invite is taken up. Read only by queries/crew.ts. */
    passwordHash: text("password_hash"),
    /** A signed-in token carries the version it was made with; raising it signs the person out everywhere. */
    sessionVersion: integer("session_version").notNull().default(1),
    createdAt: moment("created_at").notNull(),
    removedAt: moment("removed_at"),
  },
  (t) => [unique("members_shop_row").on(t.shopId, t.id), uniqueIndex("members_email").on(t.email)],
);

export const memberRoles = sqliteTable(
  "member_roles",
  {
    shopId: integer("shop_id").notNull(),
    memberId: integer("member_id").notNull(),
    role: text("role", { enum: ROLES }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.memberId, t.role] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

/** Which messages a person has turned off. No row: they get it. */
export const mailRefusals = sqliteTable(
  "mail_refusals",
  {
    shopId: integer("shop_id").notNull(),
    memberId: integer("member_id").notNull(),
    kind: text("kind", { enum: MAIL_KINDS }).notNull(),
  },
  (t) => [
    primaryKey({ columns: [t.memberId, t.kind] }),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const invites = sqliteTable(
  "invites",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    shopId: integer("shop_id")
      .notNull()
      .references(() => shops.id),
    email: text("email").notNull(),
    name: text("name").notNull(),
    roles: text("roles", { mode: "json" }).$type<(typeof ROLES)[number][]>().notNull(),
    /** SHA-256 of the token in the link; the token itself is only in the mail. */
    tokenHash: text("token_hash").notNull(),
    invitedById: integer("invited_by_id").notNull(),
    createdAt: moment("created_at").notNull(),
    expiresAt: moment("expires_at").notNull(),
    acceptedAt: moment("accepted_at"),
    revokedAt: moment("revoked_at"),
  },
  (t) => [
    uniqueIndex("invites_token").on(t.tokenHash),
    index("invites_shop").on(t.shopId, t.createdAt),
    foreignKey({ columns: [t.shopId, t.invitedById], foreignColumns: [members.shopId, members.id] }),
  ],
);

export const passwordResets = sqliteTable(
  "password_resets",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    shopId: integer("shop_id").notNull(),
    memberId: integer("member_id").notNull(),
    tokenHash: text("token_hash").notNull(),
    createdAt: moment("created_at").notNull(),
    expiresAt: moment("expires_at").notNull(),
    usedAt: moment("used_at"),
  },
  (t) => [
    uniqueIndex("password_resets_token").on(t.tokenHash),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);

/** Tries in the window, by key `e:<e-mail>` or `i:<address>`. Not a shop's row: a stranger has no shop. */
export const signInAttempts = sqliteTable(
  "sign_in_attempts",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    key: text("key").notNull(),
    at: moment("at").notNull(),
  },
  (t) => [index("sign_in_attempts_key").on(t.key, t.at)],
);

/** Who changed what about people, roles, rates and the library. Append-only by trigger. */
export const auditEntries = sqliteTable(
  "audit_entries",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    shopId: integer("shop_id")
      .notNull()
      .references(() => shops.id),
    memberId: integer("member_id"),
    action: text("action").notNull(),
    subject: text("subject").notNull(),
    detail: text("detail", { mode: "json" }).$type<Record<string, unknown>>().notNull(),
    at: moment("at").notNull(),
  },
  (t) => [
    index("audit_entries_shop").on(t.shopId, t.id),
    foreignKey({ columns: [t.shopId, t.memberId], foreignColumns: [members.shopId, members.id] }),
  ],
);
