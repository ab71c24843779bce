/**
 * Decodes one HEIC file and writes it as a JPEG, in a process of its own: the decoder takes hundreds of megabytes and
 * would stand on the server's thread. Arguments: source, target, most pixels, JPEG quality.
 * The picture comes out upright (the format's own rotation is applied); colours stay in the picture's own space.
 */
import fs from "node:fs/promises";
import decode from "heic-decode";
import sharp from "sharp";

const [source, target, mostPixels, quality] = process.argv.slice(2);
const pictures = await decode.all({ buffer: await fs.readFile(source) });
const [first] = pictures;
if (!first || first.width * first.height > Number(mostPixels)) process.exit(3);
const { width, height, data } = await first.decode();
await sharp(data, { raw: { width, height, channels: 4 } })
  .removeAlpha()
  .jpeg({ quality: Number(quality) })
  .toFile(target);
process.exit(0);
