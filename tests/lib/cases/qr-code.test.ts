import { describe, expect, it } from "vitest";
import { qrCode, qrViewBox } from "@/lib/cases/qr-code";

/** The finder pattern of ISO/IEC 18004, 5.3.2: a ring of 7, a light ring of 5, a core of 3. */
const FINDER = ["1111111", "1000001", "1011101", "1011101", "1011101", "1000001", "1111111"];

function modules(text: string): { size: number; isDark: (column: number, row: number) => boolean } {
  const { size, path } = qrCode(text);
  const dark = new Set([...path.matchAll(/M(\d+) (\d+)h1v1h-1z/g)].map((match) => `${match[1]},${match[2]}`));
  return { size, isDark: (column, row) => dark.has(`${column},${row}`) };
}

function square(code: ReturnType<typeof modules>, left: number, top: number): string[] {
  return FINDER.map((line, row) =>
    [...line].map((_, column) => (code.isDark(left + column, top + row) ? "1" : "0")).join(""),
  );
}

describe("the QR code of a hold tag", () => {
  const code = modules("https://shop.example/cases/CT-2607-0042");

  it("has the three finder patterns that every scanner looks for, and none in the fourth corner", () => {
    const far = code.size - 7;
    expect(square(code, 0, 0)).toEqual(FINDER);
    expect(square(code, far, 0)).toEqual(FINDER);
    expect(square(code, 0, far)).toEqual(FINDER);
    expect(square(code, far, far)).not.toEqual(FINDER);
  });

  it("has an edge of 17 + 4 × version modules, with four empty ones round it", () => {
    // ISO/IEC 18004, 5.1: version v has 17 + 4v modules an edge.
    expect((code.size - 17) % 4).toBe(0);
    expect(qrViewBox(code.size)).toBe(`-4 -4 ${code.size + 8} ${code.size + 8}`);
  });

  it("prints each module at half a millimetre or more on a 30 mm code", () => {
    // 0.5 mm is what phone cameras read at arm's length without trouble: common practice of label printers.
    expect(30 / (code.size + 8)).toBeGreaterThan(0.5);
  });
});
