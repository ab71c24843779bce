import fs from "node:fs";
import path from "node:path";

const ROOT = path.resolve(import.meta.dirname, "../..");

/** Every TypeScript file below these folders, as paths from the project's root. */
export function sourceFiles(...folders: string[]): string[] {
  return folders.flatMap((folder) =>
    fs
      .readdirSync(path.join(ROOT, folder), { recursive: true, encoding: "utf8" })
      .filter((name) => /\.tsx?$/.test(name) && !name.endsWith(".d.ts"))
      .map((name) => path.join(folder, name)),
  );
}

export const readSource = (file: string) => fs.readFileSync(path.join(ROOT, file), "utf8");

/** What a file imports from inside the project, as paths from its root, without ending. */
export function projectImports(file: string): string[] {
  const found = readSource(file).matchAll(/(?:from|import)\s*\(?\s*"((?:@\/|\.)[^"]+)"/g);
  return [...found].flatMap(([, name]) => {
    if (!name) return [];
    return [name.startsWith("@/") ? name.slice(2) : path.join(path.dirname(file), name)];
  });
}
