import { describe, expect, it } from "vitest";
import { passwordFault } from "@/lib/crew/password-rule";

// The floor of 12 is the product's own decision; common and context words are refused as NIST SP 800-63B 5.1.1.2 says.
describe("a new password", () => {
  it("is taken at twelve characters and refused at eleven", () => {
    expect(passwordFault("rinse twice!", "ruth@shop.example")).toBeNull();
    expect(passwordFault("rinse twice", "ruth@shop.example")).toContain("at least 12");
  });

  it("is taken with spaces, without digits and at 256 characters", () => {
    expect(passwordFault("copper strike on brass shells", "ruth@shop.example")).toBeNull();
    expect(passwordFault("rinse twice!".repeat(21) + "four", "ruth@shop.example")).toBeNull();
  });

  it("is refused beyond 256 characters", () => {
    expect(passwordFault(`${"rinse twice!".repeat(21)}fivee`, "ruth@shop.example")).toContain("at most 256");
  });

  it.each(["Password1234", "qwerty 123456", "aaaaaaaaaaaa", "ababababababab"])(
    "is refused when guessers try %s first",
    (common) => {
      expect(passwordFault(common, "ruth@shop.example")).toContain("first that guessers try");
    },
  );

  it.each(["ruth@shop.example", "Ruth@Shop.example12", "tobias.l2026!", "tobias.ltobias.l"])(
    "is refused when %s is little more than one's own e-mail",
    (password) => {
      const email = password.toLowerCase().startsWith("ruth") ? "ruth@shop.example" : "tobias.l@shop.example";
      expect(passwordFault(password, email)).toContain("Your e-mail");
    },
  );
});
