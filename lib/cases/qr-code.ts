import QRCode from "qrcode";

/** Modules of empty paper round the code (ISO/IEC 18004, 5.3.8: four). */
export const QUIET_MODULES = 4;

/**
 * A QR code as one SVG path, a module being one unit. Level Q: a quarter of it may be wet or rubbed off.
 * @returns `size`, the edge in modules without the quiet zone, and `path`, the dark modules
 * @example qrCode("https://shop.example/cases/CT-2607-0042").size === 33
 */
export function qrCode(text: string): { size: number; path: string } {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: "Q" });
  const parts: string[] = [];
  for (let row = 0; row < modules.size; row += 1) {
    for (let column = 0; column < modules.size; column += 1) {
      if (modules.data[row * modules.size + column]) parts.push(`M${column} ${row}h1v1h-1z`);
    }
  }
  return { size: modules.size, path: parts.join("") };
}

/** The view box that holds the code and its quiet zone. */
export function qrViewBox(size: number): string {
  const edge = size + 2 * QUIET_MODULES;
  return `${-QUIET_MODULES} ${-QUIET_MODULES} ${edge} ${edge}`;
}
