import { describe, expect, it } from "vitest";
import { readSource, sourceFiles } from "./source-files";

/**
 * Routes that are not built by `handle`, each with the reason. They speak a protocol that is not ours, or are open
 * to the world on purpose.
 */
const OWN_GUARD: Record<string, string> = {
  "app/api/auth/[...nextauth]/route.ts": "next-auth's own handler",
  "app/api/uploadthing/route.ts": "the upload kit's own handler; its middleware asks for the permission",
  "app/api/ingest/[key]/route.ts": "the stand-in of the upload service: every request is signed",
  "app/api/health/route.ts": "open: says nothing that is private",
};

const routes = sourceFiles("app").filter((file) => file.endsWith("route.ts") || file.endsWith("route.tsx"));
const pages = sourceFiles("app/(shop)").filter((file) => file.endsWith("page.tsx"));
const actions = sourceFiles("app").filter((file) => /^\s*"use server"/.test(readSource(file)));

describe("entries", () => {
  it("builds every route with the one wrapper, which asks who, may they, and is the input right", () => {
    expect(routes.length).toBeGreaterThan(5);
    const bare = routes
      .filter((file) => !(file in OWN_GUARD))
      .filter((file) => {
        const exported = [
          ...readSource(file).matchAll(
            /export (?:const|async function|function) (GET|POST|PUT|PATCH|DELETE|HEAD)\b([^\n]*)/g,
          ),
        ];
        return exported.length === 0 || exported.some(([, , rest]) => !/^ = handle\(/.test(rest ?? ""));
      });
    expect(bare).toEqual([]);
  });

  it("has a reason for each route that is not, and none too many", () => {
    expect(Object.keys(OWN_GUARD).filter((file) => !routes.includes(file))).toEqual([]);
  });

  it("builds every server action with a wrapper", () => {
    expect(actions.length).toBeGreaterThan(1);
    const bare = actions.filter((file) =>
      [...readSource(file).matchAll(/export (?:const|async function|function) (\w+)([^\n]*)/g)].some(
        ([, , rest]) => !/^ = (act|publicAct)\(/.test(rest ?? ""),
      ),
    );
    expect(bare).toEqual([]);
  });

  it("guards every page of the shop in its own first lines: a layout is not a guard", () => {
    expect(pages.length).toBeGreaterThan(8);
    expect(pages.filter((file) => !/await guardPage\("/.test(readSource(file)))).toEqual([]);
  });
});
