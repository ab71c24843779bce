import { runAsServer } from "@/tests/fixtures/as-server";
import { prepareServer } from "@/tests/fixtures/built-server";
import { goodJpeg } from "@/tests/fixtures/hostile";
import { killDuringConfirmation } from "./kill-nine-confirmation";
import { killDuringThumbnailing, killDuringUpload } from "./kill-nine-photos";
import type { PhaseResult, World } from "./kill-nine-world";

/**
 * Kills the built server with SIGKILL at random moments, 20 times each during upload, thumbnailing and confirmation. After
 * each restart no accepted photo or row may be missing and no half-made one may show.
 *   npx tsx tests/scripts/kill-nine.ts [kills a phase] [phase]
 */
await runAsServer(import.meta.url, main);

async function main(): Promise<void> {
  const kills = Number(process.argv[2] ?? 20);
  const only = process.argv[3];
  const server = await prepareServer();
  try {
    await server.start();
    const { plater, senior } = server.shop.members;
    const cookies = { plater: await server.signIn(plater.email), senior: await server.signIn(senior.email) };
    // About 2 megapixels: long enough on its way, and in the making, to be hit.
    const world: World = { server, cookies, content: await goodJpeg(1_600, 1_200), kills };
    const phases = {
      upload: killDuringUpload,
      thumbnailing: killDuringThumbnailing,
      confirmation: killDuringConfirmation,
    };
    let faults = 0;
    for (const [name, phase] of Object.entries(phases)) {
      if (only && only !== name) continue;
      const result = await phase(world);
      print(name, kills, result);
      faults += result.faults.length;
    }
    console.log(faults === 0 ? "\nNothing accepted was lost, nothing half-made was shown." : `\n${faults} faults.`);
    process.exitCode = faults > 0 ? 1 : 0;
  } finally {
    await server.remove();
  }
}

function print(name: string, kills: number, { faults, counts }: PhaseResult): void {
  const words = Object.entries(counts).map(([what, count]) => `${count} ${what}`);
  console.log(`${name}: ${kills} kills. ${words.join(", ")}. Faults: ${faults.length}`);
  for (const fault of faults) console.log(`  FAULT ${fault}`);
}
