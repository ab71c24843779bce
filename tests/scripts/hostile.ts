import fs from "node:fs";
import { randomUUID } from "node:crypto";
import { runAsServer } from "@/tests/fixtures/as-server";
import { prepareServer, type BuiltServer } from "@/tests/fixtures/built-server";
import { goodJpeg, hostileFiles, type HostileFile } from "@/tests/fixtures/hostile";
import { uploadClient } from "@/tests/fixtures/upload-client";

/**
 * Uploads 24 hostile or broken files to the built server by the real protocol, one by one and then all at once. Each must
 * be refused in words and leave nothing; the server must stay below 1 GB and go on serving.
 *   npx tsx tests/scripts/hostile.ts
 */
const MOST_BYTES = 1e9;

type Client = ReturnType<typeof uploadClient>;

await runAsServer(import.meta.url, main);

async function main(): Promise<void> {
  const server = await prepareServer();
  try {
    await server.start();
    const cookie = await server.signIn(server.shop.members.plater.email);
    const client = uploadClient(fetch, server.origin, { cookie });
    const files = await hostileFiles();
    const faults = [...(await sendEach(client, files)), ...(await sendAll(client, files))];
    faults.push(
      ...(await sendMoreThanSaid(client)),
      ...leftOver(server),
      ...(await stillServes(server, client, cookie)),
    );
    const peak = server.peakMemory();
    if (peak > MOST_BYTES) faults.push(`The server took ${Math.round(peak / 1e6)} MB.`);
    console.log(
      `\n${files.length} files, each sent twice. Most memory: ${Math.round(peak / 1e6)} MB. Faults: ${faults.length}`,
    );
    for (const fault of faults) console.log(`  FAULT ${fault}`);
    process.exitCode = faults.length > 0 ? 1 : 0;
  } finally {
    await server.remove();
  }
}

async function sendEach(client: Client, files: HostileFile[]): Promise<string[]> {
  const faults: string[] = [];
  for (const [index, file] of files.entries()) {
    const { status, words } = await send(client, file);
    console.log(`${String(index + 1).padStart(2)}  ${file.name.padEnd(24)} ${status}  ${words}`);
    faults.push(...judge(file, status, words));
  }
  return faults;
}

async function sendAll(client: Client, files: HostileFile[]): Promise<string[]> {
  const answers = await Promise.all(files.map(async (file) => ({ file, ...(await send(client, file)) })));
  return answers.flatMap(({ file, status, words }) => judge(file, status, words));
}

async function send(client: Client, { name, type, content }: HostileFile): Promise<{ status: number; words: string }> {
  const answer = await client.upload({ name, type, content });
  const body = (await answer.json().catch(() => ({}))) as { detail?: string };
  return { status: answer.status, words: body.detail ?? "" };
}

function judge({ name, says }: HostileFile, status: number, words: string): string[] {
  const isRefused = status >= 400 && status < 500 && says.test(words);
  return isRefused ? [] : [`${name}: ${status} ${words || "without words"}`];
}

/** Announces a small file and sends a large one. */
async function sendMoreThanSaid(client: Client): Promise<string[]> {
  const { url } = await client.place({ content: await goodJpeg() });
  // The server may cut the line instead of listening to the end.
  const status = await client.put(url, Buffer.alloc(60 * 1024 ** 2, 1)).then(
    (answer) => answer.status,
    () => 0,
  );
  return status === 413 || status === 0 ? [] : [`more than was said: ${status}`];
}

function leftOver({ uploadsDir, openDb }: BuiltServer): string[] {
  const files = fs.readdirSync(uploadsDir, { recursive: true, withFileTypes: true }).filter((entry) => entry.isFile());
  const db = openDb();
  const rows = db.$client.prepare("select count(*) as n from photos").get() as { n: number };
  db.$client.close();
  const faults = files.map((file) => `left on the disk: ${file.name}`);
  return rows.n > 0 ? [...faults, `left in the database: ${rows.n} photos`] : faults;
}

async function stillServes(server: BuiltServer, client: Client, cookie: string): Promise<string[]> {
  const photoId = randomUUID();
  const answer = await client.upload({ content: await goodJpeg(), photoId });
  if (!answer.ok) return [`a good photo afterwards: ${answer.status}`];
  const until = Date.now() + 20_000;
  while (Date.now() < until) {
    const view = await fetch(`${server.origin}/api/photos/${photoId}/view`, { headers: { cookie } });
    if (view.ok) return [];
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return ["a good photo afterwards was not prepared"];
}
