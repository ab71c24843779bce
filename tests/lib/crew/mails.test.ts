import { describe, expect, it } from "vitest";
import { caseConfirmedMail, inviteMail, passwordResetMail, secondLookMail } from "@/lib/crew/mails";

const waiting = (ref: string) => ({
  ref,
  calledTitle: "Dewetting",
  job: "J-3318",
  quantity: 3,
  link: `https://shop.example/cases/${ref}/second-look`,
});

describe("the mails", () => {
  it("carry the link in both forms", () => {
    const link = "https://shop.example/invite/abc";
    const mail = inviteMail({ shopName: "Fernhollow", invitedBy: "Ruth", name: "Ines", roles: ["senior"], link });
    expect(mail.text).toContain(`\n${link}\n`);
    expect(mail.html).toContain(`href="${link}"`);
    expect(mail.text).toContain("Senior tech");
  });

  it("show a name with marks in it as a name, never as markup", () => {
    const mail = passwordResetMail({ name: `<img src=x onerror="alert('1')">`, link: "https://shop.example/" });
    expect(mail.html).not.toContain("<img");
    expect(mail.html).toContain("&lt;img src=x onerror=&quot;alert(&#39;1&#39;)&quot;&gt;");
  });

  it("bundle every part that waits into one message", () => {
    const cases = [waiting("CT-2607-0001"), waiting("CT-2607-0002")];
    const mail = secondLookMail({ name: "Ines", shopName: "Fernhollow", cases, queueLink: "https://shop.example/q" });
    expect(mail.subject).toBe("2 parts wait for your second look (Fernhollow)");
    for (const each of cases)
      expect(mail.text).toContain(`${each.ref}: called Dewetting, job J-3318, 3 parts\n${each.link}`);
  });

  it("name the part when only one waits", () => {
    const mail = secondLookMail({
      name: "Ines",
      shopName: "Fernhollow",
      cases: [waiting("CT-2607-0001")],
      queueLink: "x",
    });
    expect(mail.subject).toBe("CT-2607-0001 waits for your second look (Fernhollow)");
  });

  it("are not made for an empty queue", () => {
    expect(() => secondLookMail({ name: "Ines", shopName: "F", cases: [], queueLink: "x" })).toThrow(RangeError);
  });

  it("tell the plater the class, or that the part was sound", () => {
    const facts = { name: "Tobias", ref: "CT-2607-0001", confirmedBy: "Ines", dispositionTitle: "Rework", link: "x" };
    expect(caseConfirmedMail({ ...facts, classTitle: "Dewetting" }).text).toContain(
      "confirmed Dewetting.\n\nDisposition: Rework.",
    );
    const released = caseConfirmedMail({ ...facts, classTitle: null, dispositionTitle: null });
    expect(released.subject).toBe("CT-2607-0001 is released as sound");
  });
});
