import { describe, expect, it } from "vitest";
import { auditDetail, auditSentence, auditWords } from "@/lib/crew/audit-words";
import { clockWords } from "@/lib/crew/clock-words";
import { doorNote } from "@/lib/crew/door-words";
import { textParts } from "@/lib/crew/mail-text";
import { pageBefore } from "@/lib/crew/page-before";
import { SIGN_IN_WRONG, signInWords, tooManyCode } from "@/lib/crew/sign-in-words";
import { tryAgainWords } from "@/lib/crew/try-again";

describe("what a refused sign-in says", () => {
  it("says the same for every wrong pair", () => {
    // look.md section 11 gives this sentence.
    expect(SIGN_IN_WRONG).toBe("E-mail or password is wrong.");
    expect(signInWords("CredentialsSignin")).toBe(SIGN_IN_WRONG);
  });

  it("says when to try again after too many tries", () => {
    expect(signInWords(tooManyCode(8 * 60_000 + 1))).toBe("Too many tries. Try again in 9 minutes.");
  });

  it("never repeats words that somebody else put into the address", () => {
    expect(signInWords("Call 555 0100 to unlock")).not.toContain("555");
  });

  it("never promises too early and never says zero minutes", () => {
    expect(tryAgainWords(0)).toBe("in a minute");
    expect(tryAgainWords(60_000)).toBe("in a minute");
    expect(tryAgainWords(60_001)).toBe("in 2 minutes");
    expect(() => tryAgainWords(-1)).toThrow(RangeError);
  });
});

describe("the words of the audit trail", () => {
  it("says which roles became which", () => {
    expect(auditDetail({ from: ["plater"], to: ["plater", "senior"] })).toBe("Plater → Plater, Senior tech");
  });

  it("names whom it was done to, and a person once when they did it to themselves", () => {
    const removed = { action: "member.removed", subject: "Tobias", memberName: "Ruth" };
    expect(auditSentence(removed)).toBe("removed from the crew Tobias");
    const joined = { action: "member.joined", subject: "Ines", memberName: "Ines" };
    expect(auditSentence(joined)).toBe("joined the crew");
    expect(auditSentence({ ...joined, memberName: "Ines Varga" })).toBe("joined the crew, then called Ines");
  });

  it("shows an action that it does not know by its key, never hides it", () => {
    expect(auditWords("member.roles")).toBe("changed the roles of");
    expect(auditWords("tank.exploded")).toBe("tank.exploded");
    expect(auditWords("toString")).toBe("toString");
  });

  it("shows the shop's wall clock, summer time included", () => {
    // Stockholm is at UTC+2 in July and UTC+1 in January.
    expect(clockWords(Date.UTC(2026, 6, 6, 12, 5), "Europe/Stockholm")).toBe("6 Jul 2026, 14:05");
    expect(clockWords(Date.UTC(2026, 0, 6, 12, 5), "Europe/Stockholm")).toBe("6 Jan 2026, 13:05");
  });
});

describe("a mail on the outbox page", () => {
  it("has its addresses as links and every other word as it was", () => {
    expect(textParts("Open\nhttps://shop.example/x?a=1\n\nBye")).toEqual([
      { kind: "words", words: "Open\n" },
      { kind: "link", href: "https://shop.example/x?a=1" },
      { kind: "words", words: "\n\nBye" },
    ]);
  });

  it("makes no link of a script", () => {
    expect(textParts("javascript:alert(1)")).toEqual([{ kind: "words", words: "javascript:alert(1)" }]);
  });
});

describe("what the address bar may ask for", () => {
  it("goes on from a row number and begins at the newest for anything else", () => {
    expect(pageBefore("42")).toBe(42);
    expect([pageBefore(undefined), pageBefore("-1"), pageBefore("x"), pageBefore(["7", "9"])]).toEqual([
      undefined,
      undefined,
      undefined,
      7,
    ]);
  });

  it("shows only the notes that exist at the sign-in", () => {
    expect(doorNote("password")?.title).toBe("The new password holds");
    expect([doorNote(undefined), doorNote("toString"), doorNote("Call 555 0100")]).toEqual([null, null, null]);
  });
});
