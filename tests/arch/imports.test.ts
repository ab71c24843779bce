import { describe, expect, it } from "vitest";
import { projectImports, sourceFiles } from "./source-files";

/**
 * Imports run one way: pure lib ← db ← lib/server ← app; components see pure lib and components. A layer is named by
 * the longest prefix that fits; what no prefix names may import nothing of the project, so that a new folder fails
 * here until somebody decides where it belongs.
 */
const LAYERS: Record<string, readonly string[]> = {
  // The shelf that ships is part of the product, not demo data: a shop may bring its newer entries in.
  "lib/server": ["lib", "lib/server", "db", "db/seed/library"],
  lib: ["lib"],
  "db/seed/library": ["lib", "db/seed/library"],
  "db/seed/demo": ["lib", "lib/server", "db", "db/seed", "db/seed/demo", "db/seed/library"],
  "db/scripts": ["lib", "lib/server", "db", "db/seed", "db/seed/demo", "db/seed/library", "db/scripts"],
  "db/seed": ["lib", "db", "db/seed", "db/seed/library"],
  db: ["lib", "db"],
  components: ["lib", "components"],
  app: ["lib", "lib/server", "db", "components", "app", "db/seed"],
};

const prefixes = Object.keys(LAYERS).toSorted((a, b) => b.length - a.length);
const layerOf = (file: string) => prefixes.find((prefix) => file === prefix || file.startsWith(`${prefix}/`));

describe("the house", () => {
  it("lets imports run one way only", () => {
    const files = sourceFiles("app", "components", "db", "lib");
    expect(files.length).toBeGreaterThan(100);
    const wrong = files.flatMap((file) => {
      const may = LAYERS[layerOf(file) ?? ""] ?? [];
      return projectImports(file)
        .filter(
          (target) => !target.endsWith(".css") && !target.endsWith(".svg") && !may.includes(layerOf(target) ?? ""),
        )
        .map((target) => `${file} imports ${target}`);
    });
    expect(wrong).toEqual([]);
  });

  it("keeps seed data out of the app, but for the gallery", () => {
    const wrong = sourceFiles("app").filter(
      (file) => !file.startsWith("app/(dev)") && projectImports(file).some((target) => target.startsWith("db/seed")),
    );
    expect(wrong).toEqual([]);
  });
});
