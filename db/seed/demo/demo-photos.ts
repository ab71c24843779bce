import fs from "node:fs/promises";
import path from "node:path";
import { eq } from "drizzle-orm";
import type { Db } from "@/db/open";
import { showPhoto } from "@/db/queries/photos";
import { photos } from "@/db/schema";
import { PART_BEDS, type PartSpec } from "@/db/seed/photos/part-spec";
import { renderMany } from "@/db/seed/photos/render-many";
import { photoPath } from "@/lib/photos/photo-path";
import { makePlaceholder } from "@/lib/server/images/placeholder";
import { makeSizes } from "@/lib/server/images/sizes";
import type { DemoShots } from "./demo-play";

export interface Shot {
  id: string;
  shopId: number;
  spec: PartSpec;
  takenAt: number;
}

/** What each photo of a played case shows. The re-strike keeps the part's seed: the same part, its fault gone or not. */
export function shotsOf(shopId: number, played: DemoShots, width: number): Shot[] {
  const { plan } = played;
  const base: PartSpec = {
    shape: plan.job.shape,
    fault: plan.fault,
    baseMetal: plan.job.baseMetal,
    seed: plan.seed,
    width,
    height: Math.round((width * 3) / 4),
    bed: PART_BEDS[plan.seed % PART_BEDS.length] ?? "tray",
    greyCard: plan.seed % 3 === 0,
    glove: plan.seed % 7 === 0,
    amount: 0.7 + ((plan.seed * 37) % 60) / 100,
  };
  const suspect = played.suspect.map((id, index): Shot => {
    const closer = index > 0 ? { zoom: 2.2, centre: { x: 0.4, y: 0.15 }, greyCard: false, glove: false } : {};
    return { id, shopId, spec: { ...base, ...closer }, takenAt: plan.openedAt - 60_000 + index * 9000 };
  });
  const restrike = played.restrike.map(({ id, isSound, round }): Shot => {
    const spec: PartSpec = isSound ? { ...base, fault: "sound", glove: false } : { ...base, amount: 0.5 };
    return { id, shopId, spec, takenAt: plan.openedAt + round * 90 * 60_000 };
  });
  return [...suspect, ...restrike];
}

/** Renders the photos on both cores and stores them as an accepted upload is stored, marked as rendered. */
export async function storeShots(
  db: Db,
  uploads: string,
  shots: readonly Shot[],
  onDone: (done: number) => void,
): Promise<void> {
  await fs.mkdir(uploads, { recursive: true });
  const orders = shots.map((shot) => ({ ...shot.spec, capturedAt: shot.takenAt }));
  const jpegs = await renderMany(orders, { workers: 2, onDone });
  for (const [index, shot] of shots.entries()) {
    const jpeg = jpegs[index];
    if (jpeg) await storeShot(db, uploads, shot, jpeg);
  }
}

async function storeShot(db: Db, uploads: string, shot: Shot, jpeg: Uint8Array): Promise<void> {
  const file = path.join(uploads, `${shot.id}.rendering`);
  await fs.writeFile(file, jpeg);
  const [sizes, placeholder] = [await makeSizes(file), await makePlaceholder(file)];
  await fs.rm(file);
  const rows: Parameters<typeof showPhoto>[3] = [];
  for (const { content, ...size } of sizes) {
    const where = photoPath(shot.shopId, shot.id, size.size, size.mime);
    await fs.mkdir(path.dirname(path.join(uploads, where)), { recursive: true });
    await fs.writeFile(path.join(uploads, where), content);
    rows.push({ ...size, path: where, bytes: content.length });
  }
  db.transaction((tx) => {
    tx.update(photos)
      .set({
        state: "processing",
        isRendered: true,
        placeholder,
        fileName: "rendered.jpg",
        format: "jpeg",
        bytes: jpeg.length,
        takenAt: shot.takenAt,
      })
      .where(eq(photos.id, shot.id))
      .run();
    showPhoto(tx, shot.shopId, shot.id, rows, shot.takenAt);
  });
}
