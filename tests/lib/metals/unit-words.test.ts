import { describe, expect, it } from "vitest";
import { bindUnits } from "@/lib/metals/pretreatment/unit-words";

describe("figures in a sentence", () => {
  it("keep their unit on the same line", () => {
    expect(bindUnits("5 to 10 A/dm², 60 to 80 °C, 1 to 3 min.")).toBe(
      "5 to 10\u00a0A/dm², 60 to 80\u00a0°C, 1 to 3\u00a0min.",
    );
    expect(bindUnits("10 to 30 % by volume, under 15 s.")).toBe("10 to 30\u00a0% by volume, under 15\u00a0s.");
  });

  it("leave a word that only begins like a unit", () => {
    expect(bindUnits("2 small parts, 3 hot rinses, 4 minutes")).toBe("2 small parts, 3 hot rinses, 4 minutes");
  });
});
