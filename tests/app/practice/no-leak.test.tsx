import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import { eq } from "drizzle-orm";
import { NextRequest } from "next/server";
import { renderToStaticMarkup } from "react-dom/server";
import sharp from "sharp";
import { afterAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Db } from "@/db/open";
import type { SignedIn } from "@/db/queries/crew";
import { cases, libraryCauses, photos, photoSizes } from "@/db/schema";
import { initialsOf } from "@/lib/crew/initials";
import { keepPhotoFiles, confirmedPhoto } from "@/tests/fixtures/practice-photos";
import { emptyDatabase, makeShop, type TestShop } from "@/tests/fixtures/shop-factory";

const now: { db: Db | null; member: SignedIn | null } = { db: null, member: null };
vi.mock("@/db/client", () => ({ getDb: () => now.db }));
vi.mock("@/lib/server/session", () => ({ currentMember: async () => now.member, guardPage: async () => now.member }));

const uploads = fs.mkdtempSync(path.join(os.tmpdir(), "coppertell-practice-"));
vi.stubEnv("UPLOADS_DIR", uploads);
vi.stubEnv("NEXTAUTH_URL", "http://localhost:3000");
afterAll(() => fs.rmSync(uploads, { recursive: true }));

const { default: QuestionPage, metadata } = await import("@/app/(shop)/practice/questions/[id]/page");
const { default: PracticePage } = await import("@/app/(shop)/practice/page");
const askRoute = await import("@/app/api/practice/questions/route");
const questionRoute = await import("@/app/api/practice/questions/[id]/route");
const answerRoute = await import("@/app/api/practice/questions/[id]/answer/route");
const photoRoute = await import("@/app/api/practice/questions/[id]/photo/route");

const NOTE = "Verdigris creeping by the keyway of the governor housing";
const ALLOY = "CDA-353 extra lead";
const DAY_MS = 86_400_000;

let db: Db;
let shop: TestShop;
let bytes: Buffer;

type Made = ReturnType<typeof confirmedPhoto>;

/** A confirmed part with everything on it that could give it away, down to what the camera wrote into the file. */
async function makePart(classSlug: string): Promise<Made> {
  const made = confirmedPhoto(db, shop, {
    classSlug,
    now: Date.now() - 60 * DAY_MS,
    snap: { note: NOTE, alloy: ALLOY, symptoms: ["stain-from-seam"], calledClass: "bleed-out" },
  });
  bytes = await sharp({ create: { width: 320, height: 240, channels: 3, background: "#b87333" } })
    .withExif({ IFD0: { ImageDescription: `${made.ref} ${classSlug} ${made.photoId}` } })
    .webp()
    .toBuffer();
  keepPhotoFiles(db, shop, made.photoId, uploads, bytes);
  db.update(photos).set({ placeholder: "1QcSHQRnh493V4dIh4eXh1h4kJUI" }).where(eq(photos.id, made.photoId)).run();
  return made;
}

async function freshShop(): Promise<void> {
  db = emptyDatabase();
  shop = await makeShop(db);
  now.db = db;
  now.member = shop.members.trainee;
}
beforeEach(freshShop);

/** Every word that leads to the part: its numbers, names, files, dates, and what was written about it. */
function secretsOf({ ref, id, photoId }: Made): string[] {
  const row = db.select().from(cases).where(eq(cases.id, id)).get();
  const photo = db.select().from(photos).where(eq(photos.id, photoId)).get();
  const files = db.select().from(photoSizes).where(eq(photoSizes.photoId, photoId)).all();
  const cause = db
    .select()
    .from(libraryCauses)
    .where(eq(libraryCauses.id, row?.confirmedCauseId ?? 0))
    .get();
  const moments = [row?.openedAt, row?.confirmedAt, photo?.createdAt, photo?.readyAt].map(String);
  const made = [ref, photoId, photoId.slice(0, 8), row?.snapKey, photo?.fileName, photo?.placeholder, NOTE, ALLOY];
  const facts = ["stain-from-seam", "Stain from a seam", "J-3318", "Orrin", "A-12", cause?.title, cause?.slug];
  const secrets = [...made, ...facts, ...moments, ...files.map((file) => file.path)];
  return secrets.filter((each): each is string => typeof each === "string" && each.length > 3 && each !== "null");
}

const request = (pathName: string, method = "GET", body?: unknown) =>
  new NextRequest(`http://localhost:3000${pathName}`, {
    method,
    headers: body === undefined ? undefined : { "content-type": "application/json" },
    body: body === undefined ? undefined : JSON.stringify(body),
  });
const params = <Values extends Record<string, string>>(values: Values) => ({ params: Promise.resolve(values) });

async function ask(): Promise<{ id: string; text: string; headers: string }> {
  const response = await askRoute.POST(request("/api/practice/questions", "POST", {}), params({}));
  const text = await response.text();
  return { id: (JSON.parse(text) as { id: string }).id, text, headers: headersOf(response) };
}
const headersOf = (response: Response) => [...response.headers].map(([name, value]) => `${name}: ${value}`).join("\n");
const page = async (id: string) => renderToStaticMarkup(await QuestionPage(params({ id })));

/** All that a browser gets before the call: JSON, headers, HTML, the address and name of the image. */
async function everythingSent(): Promise<{ id: string; sent: Record<string, string> }> {
  const asked = await ask();
  const { id } = asked;
  const shown = await questionRoute.GET(request(`/api/practice/questions/${id}`), params({ id }));
  const view = await photoRoute.GET(request(`/api/practice/questions/${id}/photo?size=view`), params({ id }));
  const thumb = await photoRoute.GET(request(`/api/practice/questions/${id}/photo?size=thumb`), params({ id }));
  return {
    id,
    sent: {
      "asking, JSON": asked.text,
      "asking, headers": asked.headers,
      "question, JSON": await shown.text(),
      "question, headers": headersOf(shown),
      "photo, headers": headersOf(view),
      "thumb, headers": headersOf(thumb),
      "photo, bytes": Buffer.from(await view.arrayBuffer()).toString("latin1"),
      "page, HTML": await page(id),
      "page, title": JSON.stringify(metadata),
      "practice, HTML": renderToStaticMarkup(await PracticePage()),
    },
  };
}

describe("before the call", () => {
  it("nothing that a browser gets names the case, its photo, its job, its cause or what was written about it", async () => {
    const made = await makePart("bleed-out");
    const secrets = secretsOf(made);
    expect(secrets.length).toBeGreaterThan(15);
    const { sent } = await everythingSent();
    const leaks = Object.entries(sent).flatMap(([where, text]) =>
      secrets.filter((secret) => text.includes(secret)).map((secret) => `${where}: ${secret}`),
    );
    expect(leaks).toEqual([]);
  });

  it("two parts that differ only in their class look the same to the letter, but for the question's number", async () => {
    /** What is sent for a part of a class in a shop of its own, with the names of shop, people and question taken out. */
    const sentFor = async (classSlug: string) => {
      await makePart(classSlug);
      const { id, sent } = await everythingSent();
      const { name, shop: facts } = shop.members.trainee;
      const plain = (text: string) =>
        text
          .replaceAll(id, "ID")
          .replaceAll(name, "TRAINEE")
          .replaceAll(facts.name, "SHOP")
          .replaceAll(initialsOf(name), "T")
          .replace(/content-length: \d+/g, "");
      const { "photo, bytes": _cutByTheNumber, ...texts } = sent;
      return Object.fromEntries(Object.entries(texts).map(([where, text]) => [where, plain(text)]));
    };
    const first = await sentFor("bleed-out");
    await freshShop();
    expect(await sentFor("peeling")).toEqual(first);
  });

  it("the image is neither the stored file nor as long, and holds nothing that the camera wrote", async () => {
    await makePart("bleed-out");
    const { id } = await ask();
    const response = await photoRoute.GET(request(`/api/practice/questions/${id}/photo`), params({ id }));
    const sent = Buffer.from(await response.arrayBuffer());
    expect(sent.equals(bytes)).toBe(false);
    expect(sent.length).not.toBe(bytes.length);
    const { exif, xmp, iptc, format } = await sharp(sent).metadata();
    expect({ exif, xmp, iptc, format }).toEqual({ exif: undefined, xmp: undefined, iptc: undefined, format: "webp" });
  });

  it("headers carry no date of the photo, and a mark and a name made from the question alone", async () => {
    await makePart("bleed-out");
    const { id } = await ask();
    const { headers } = await photoRoute.GET(request(`/api/practice/questions/${id}/photo`), params({ id }));
    expect(headers.get("last-modified")).toBeNull();
    expect(headers.get("etag")).toBe(`"${id}-view"`);
    expect(headers.get("content-disposition")).toBe('inline; filename="practice-view.webp"');
    expect(headers.get("cache-control")).toMatch(/^private/);
  });

  it("nobody else gets the question or its image", async () => {
    await makePart("bleed-out");
    const { id } = await ask();
    now.member = shop.members.otherPlater;
    const photo = await photoRoute.GET(request(`/api/practice/questions/${id}/photo`), params({ id }));
    const question = await questionRoute.GET(request(`/api/practice/questions/${id}`), params({ id }));
    expect([photo.status, question.status]).toEqual([404, 404]);
  });
});

describe("after the call", () => {
  it("the class, the case and the cause are told: so the search above looks for what is really there", async () => {
    const made = await makePart("bleed-out");
    const { id } = await ask();
    const body = { calledClass: "water-spots", sure: 2 };
    const answered = await answerRoute.POST(
      request(`/api/practice/questions/${id}/answer`, "POST", body),
      params({ id }),
    );
    expect(await answered.json()).toMatchObject({
      answered: true,
      confirmed: "bleed-out",
      right: false,
      ref: made.ref,
    });
    const html = await page(id);
    expect(html).toContain(made.ref);
    expect(html).toContain("Missed: it is bleed-out, not water spots");
  });

  it("a second call is refused in words, and the first stays", async () => {
    await makePart("bleed-out");
    const { id } = await ask();
    const send = (calledClass: string) =>
      answerRoute.POST(
        request(`/api/practice/questions/${id}/answer`, "POST", { calledClass, sure: 3 }),
        params({ id }),
      );
    await send("water-spots");
    const second = await send("bleed-out");
    expect(second.status).toBe(409);
    expect(await second.text()).toContain("Your first call stays");
    const shown = await questionRoute.GET(request(`/api/practice/questions/${id}`), params({ id }));
    expect(await shown.json()).toMatchObject({ called: "water-spots", right: false });
  });
});
