import { describe, expect, test } from "vitest";
import { shelf } from "@/db/seed/library/shelf";
import { fixStepSchema, libraryCauseSchema, libraryClassSchema } from "@/lib/library/library.schema";

const [cause] = shelf.causes;
const [entry] = shelf.classes;
const step = shelf.fixes[0]?.steps[0];

describe("what a shop sends for the library", () => {
  test("a cause without a source, station or base metal is refused at its field", () => {
    for (const [field, value] of [
      ["sourceKeys", []],
      ["station", ""],
      ["baseMetals", []],
      ["likelihood", 1.2],
      ["slug", "Not A Slug"],
    ] as const) {
      const result = libraryCauseSchema.safeParse({ ...cause, [field]: value });
      expect(result.success, field).toBe(false);
      expect(result.error?.issues[0]?.path[0]).toBe(field);
    }
  });

  test("a step without minutes is refused, a bench step without a station is not", () => {
    expect(fixStepSchema.safeParse({ ...step, minutes: 0 }).success).toBe(false);
    expect(fixStepSchema.safeParse({ ...step, station: null }).success).toBe(true);
  });

  test("an empty title is refused and fields nobody knows are left out", () => {
    expect(libraryClassSchema.safeParse({ ...entry, title: "  " }).success).toBe(false);
    expect(libraryClassSchema.parse({ ...entry, surprise: 1 })).not.toHaveProperty("surprise");
  });
});
