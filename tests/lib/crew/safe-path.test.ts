import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { safePath } from "@/lib/crew/safe-path";

describe("where a person goes after signing in", () => {
  it.each([["/"], ["/cases?station=3&q=a%20b"], ["/library/water-spots#fixes"]])("keeps %s of this site", (path) => {
    expect(safePath(path)).toBe(path);
  });

  it.each([
    ["nothing", undefined],
    ["another site", "https://evil.example/"],
    ["a scheme-less other site", "//evil.example/x"],
    ["a backslash that browsers read as a slash", "/\\evil.example"],
    ["a tab that browsers drop", "/\t/evil.example"],
    ["dots that leave two slashes", "/..//evil.example"],
    ["a script", "javascript:alert(1)"],
    ["the sign-in page itself", "/sign-in?from=/cases"],
    ["no page", "/api/auth/signout"],
    ["a relative path", "cases"],
  ])("turns %s into the first page", (_what, from) => {
    expect(safePath(from)).toBe("/");
  });

  it("never leaves the site, whatever the address bar says", () => {
    const bits = fc.array(fc.constantFrom("/", "\\", "\t", "\n", "..", "evil.example", ":", "@", "a", "%2f", "?"), {
      maxLength: 8,
    });
    fc.assert(
      fc.property(bits, (parts) => {
        const path = safePath(`/${parts.join("")}`);
        // What a browser makes of it: the WHATWG URL parser, https://url.spec.whatwg.org
        expect(new URL(path, "https://shop.example").origin).toBe("https://shop.example");
      }),
    );
  });
});
