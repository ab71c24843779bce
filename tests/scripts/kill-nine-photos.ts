import { randomUUID } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import sharp from "sharp";
import { uploadClient } from "@/tests/fixtures/upload-client";
import { killWithin, spanOf, until, type PhaseResult, type World } from "./kill-nine-world";

const PHOTOS_A_ROUND = 3;
const SIZES = ["thumb", "view", "original"] as const;

/** Photos go up while the server is killed. What it accepted must be there; the rest goes on from where it stopped. */
export async function killDuringUpload(world: World): Promise<PhaseResult> {
  const result: PhaseResult = {
    faults: [],
    counts: { sent: 0, "accepted before the kill": 0, "gone on afterwards": 0 },
  };
  const spanMs = await spanOf(() => Promise.all(newIds().map((id) => send(world, id))));
  for (let round = 0; round < world.kills; round++) {
    const ids = newIds();
    const accepted = new Set<string>();
    const sending = ids.map((id) => send(world, id).then((isKept) => isKept && accepted.add(id)));
    await killWithin(world, spanMs);
    await Promise.all(sending);
    await restart(world, ids, accepted, result);
    count(result, "sent", ids.length);
    count(result, "accepted before the kill", accepted.size);
    for (const id of ids.filter((each) => !accepted.has(each))) {
      if (await send(world, id)) count(result, "gone on afterwards", 1);
      else result.faults.push(`upload ${round}: photo ${id} could not be sent again`);
    }
    await checkReady(world, ids, result);
  }
  return result;
}

/** Photos are accepted, and the server is killed while it makes their sizes. All must stand after the next start. */
export async function killDuringThumbnailing(world: World): Promise<PhaseResult> {
  const result: PhaseResult = {
    faults: [],
    counts: { accepted: 0, "ready before the kill": 0, "finished afterwards": 0 },
  };
  const first = newIds();
  await Promise.all(first.map((id) => send(world, id)));
  const spanMs = await spanOf(() => checkReady(world, first, result));
  for (let round = 0; round < world.kills; round++) {
    const ids = newIds();
    const kept = await Promise.all(ids.map((id) => send(world, id)));
    if (kept.includes(false)) result.faults.push(`thumbnailing ${round}: a photo was not accepted`);
    await killWithin(world, spanMs);
    const ready = readyInDatabase(world, ids);
    await restart(world, ids, new Set(ids), result);
    await checkReady(world, ids, result);
    count(result, "accepted", ids.length);
    count(result, "ready before the kill", ready);
    count(result, "finished afterwards", ids.length - ready);
  }
  return result;
}

const newIds = () => Array.from({ length: PHOTOS_A_ROUND }, () => randomUUID());

function count({ counts }: PhaseResult, what: string, by: number): void {
  counts[what] = (counts[what] ?? 0) + by;
}

async function send({ server, cookies, content }: World, photoId: string): Promise<boolean> {
  const client = uploadClient(fetch, server.origin, { cookie: cookies.plater });
  return client.upload({ content, photoId }).then(
    (answer) => answer.ok,
    () => false,
  );
}

/** Starts the server and looks at once: whatever shows must be whole, whatever was accepted must be known. */
async function restart(world: World, ids: string[], accepted: Set<string>, result: PhaseResult): Promise<void> {
  checkRows(world, result);
  await world.server.start();
  for (const id of ids) {
    const state = await stateOf(world, id);
    if (accepted.has(id) && state !== "processing" && state !== "ready") {
      result.faults.push(`photo ${id} was accepted and is ${state ?? "gone"}`);
    }
    for (const size of SIZES) await checkShown(world, id, size, result);
  }
}

async function stateOf({ server, cookies }: World, id: string): Promise<string | null> {
  const answer = await fetch(`${server.origin}/api/photos/${id}`, { headers: { cookie: cookies.plater } });
  return answer.ok ? ((await answer.json()) as { state: string }).state : null;
}

/** A size is either not shown or a whole picture. @returns whether it is shown */
async function checkShown({ server, cookies }: World, id: string, size: string, result: PhaseResult): Promise<boolean> {
  const answer = await fetch(`${server.origin}/api/photos/${id}/${size}`, { headers: { cookie: cookies.plater } });
  if (!answer.ok) return false;
  const bytes = Buffer.from(await answer.arrayBuffer());
  const isWhole = await sharp(bytes)
    .stats()
    .then(
      () => true,
      () => false,
    );
  if (!isWhole) result.faults.push(`photo ${id}: half a ${size} was shown`);
  return true;
}

async function checkReady(world: World, ids: string[], result: PhaseResult): Promise<void> {
  for (const id of ids) {
    await until(`photo ${id}`, async () => ((await stateOf(world, id)) === "ready" ? true : null)).catch(
      (error: Error) => result.faults.push(error.message),
    );
    for (const size of SIZES) {
      if (!(await checkShown(world, id, size, result))) result.faults.push(`photo ${id}: no ${size}`);
    }
  }
}

interface Row {
  id: string;
  state: string;
  path: string | null;
  bytes: number | null;
}

/** While the server is down: rows and files must tell the same story. */
function checkRows({ server }: World, { faults }: PhaseResult): void {
  const db = server.openDb();
  const sql = "select p.id, p.state, s.path, s.bytes from photos p left join photo_sizes s on s.photo_id = p.id";
  const rows = db.$client.prepare(sql).all() as Row[];
  const jobs = db.$client
    .prepare(
      "select json_extract(payload, '$.photoId') as id from jobs where kind = 'photo-sizes' and state in ('waiting', 'running')",
    )
    .all() as { id: string }[];
  db.$client.close();
  const waiting = new Set(jobs.map((job) => job.id));
  for (const { id, state, path: stored, bytes } of rows) {
    if (state === "processing" && !waiting.has(id)) faults.push(`photo ${id} is being prepared and no job does it`);
    if (state === "processing" && stored) faults.push(`photo ${id} has sizes and is not ready`);
    if (state === "ready" && !stored) faults.push(`photo ${id} is ready and has no size`);
    if (stored && sizeOnDisk(path.join(server.uploadsDir, stored)) !== bytes)
      faults.push(`photo ${id}: ${stored} is not whole`);
  }
}

function sizeOnDisk(file: string): number {
  return fs.statSync(file, { throwIfNoEntry: false })?.size ?? -1;
}

function readyInDatabase({ server }: World, ids: string[]): number {
  const db = server.openDb();
  const ready = db.$client.prepare("select id from photos where state = 'ready'").all() as { id: string }[];
  db.$client.close();
  return ready.filter((row) => ids.includes(row.id)).length;
}
