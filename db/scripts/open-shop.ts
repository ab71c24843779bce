/**
 * `npm run shop:open -- --name "Fjord Plating" --owner "Ann Berg" --email ann@fjord.example --zone Europe/Oslo --currency NOK`
 * opens a real shop and prints the link by which its owner sets a password.
 */
import { randomBytes } from "node:crypto";
import { parseArgs } from "node:util";
import { z } from "zod";
import { insertPasswordReset } from "../queries/password-resets";
import { openShop } from "../seed/factories/open-shop";
import { databaseFile, openDatabase } from "../open";
import { readEnv } from "@/lib/env";
import { emailInput, personNameInput } from "@/lib/crew/crew.schema";
import { routes } from "@/lib/routes";
import { hashPassword } from "@/lib/server/passwords";
import { newToken } from "@/lib/server/crew/tokens";

const DAY_MS = 86_400_000;

const input = z.object({
  name: z.string({ error: "--name: the shop's name" }).trim().min(1),
  owner: personNameInput,
  email: emailInput,
  zone: z
    .string({ error: "--zone: a time zone as in Europe/Oslo" })
    .refine(
      (zone) => Intl.supportedValuesOf("timeZone").includes(zone) || zone === "UTC",
      "--zone: a time zone as in Europe/Oslo",
    ),
  currency: z
    .string({ error: "--currency: as in EUR" })
    .regex(/^[A-Z]{3}$/, "--currency: three capital letters, as in EUR"),
});

const text = { type: "string" } as const;
const { values } = parseArgs({ options: { name: text, owner: text, email: text, zone: text, currency: text } });
const parsed = input.safeParse(values);
if (!parsed.success) {
  for (const issue of parsed.error.issues) console.error(`${issue.path.join(".")}: ${issue.message}`);
  process.exit(1);
}
const { name, owner, email, zone, currency } = parsed.data;
const now = Date.now();
const { token, tokenHash } = newToken();
// Nobody knows this password: the link is the way in.
const passwordHash = await hashPassword(randomBytes(32).toString("hex"));
const slug = name
  .toLowerCase()
  .replace(/[^a-z0-9]+/g, "-")
  .replace(/^-+|-+$/g, "");

const env = readEnv();
const db = openDatabase(databaseFile(env.DATA_DIR));
db.transaction((tx) => {
  const shop = { slug, name, timeZone: zone, currency, owner: { name: owner, email, passwordHash }, now };
  const { shopId, ownerId } = openShop(tx, shop);
  insertPasswordReset(tx, { shopId, memberId: ownerId, tokenHash, now, expiresAt: now + 3 * DAY_MS });
});
db.$client.close();
console.log(
  `${name} is open. ${owner} sets a password within three days at\n${env.NEXTAUTH_URL}${routes.resetPassword(token)}`,
);
