import { describe, expect, it } from "vitest";
import {
  acceptInviteInput,
  changeRolesInput,
  inviteInput,
  mailChoicesInput,
  signInInput,
} from "@/lib/crew/crew.schema";
import { readForm } from "@/lib/server/form";

function form(entries: [string, string][]): Record<string, unknown> {
  const data = new FormData();
  for (const [name, value] of entries) data.append(name, value);
  return readForm(data);
}

describe("the forms of the crew", () => {
  it("stores an e-mail in lower case without spaces around it", () => {
    const input = inviteInput.parse(
      form([
        ["email", "  Ines@Shop.Example "],
        ["name", "Ines"],
        ["roles[]", "senior"],
      ]),
    );
    expect(input.email).toBe("ines@shop.example");
  });

  it("keeps a name on one line, so that it cannot break a subject line", () => {
    const input = inviteInput.parse(
      form([
        ["email", "a@b.example"],
        ["name", " Ines\r\nBcc: x "],
        ["roles[]", "senior"],
      ]),
    );
    expect(input.name).toBe("Ines Bcc: x");
  });

  it("keeps each role once and refuses a role that does not exist", () => {
    const twice = form([
      ["memberId", "4"],
      ["roles[]", "senior"],
      ["roles[]", "plater"],
      ["roles[]", "senior"],
    ]);
    expect(changeRolesInput.parse(twice)).toEqual({ memberId: 4, roles: ["plater", "senior"] });
    expect(
      changeRolesInput.safeParse(
        form([
          ["memberId", "4"],
          ["roles[]", "boss"],
        ]),
      ).success,
    ).toBe(false);
  });

  it("asks for at least one role", () => {
    const result = changeRolesInput.safeParse(form([["memberId", "4"]]));
    expect(result.error?.issues.map((issue) => issue.message)).toEqual(["Choose at least one role."]);
  });

  it("refuses an e-mail that is none and a password longer than can be kept", () => {
    expect(
      signInInput.safeParse(
        form([
          ["email", "tobias"],
          ["password", "x"],
        ]),
      ).success,
    ).toBe(false);
    expect(
      signInInput.safeParse(
        form([
          ["email", "a@b.example"],
          ["password", "x".repeat(257)],
        ]),
      ).success,
    ).toBe(false);
  });

  it("refuses a link that was cut short", () => {
    const result = acceptInviteInput.safeParse(
      form([
        ["token", "abc"],
        ["name", "Ines"],
        ["password", "rinse twice!"],
      ]),
    );
    expect(result.error?.issues.map((issue) => issue.message)).toEqual(["This link is not whole."]);
  });

  it("reads no ticked message as none wanted", () => {
    expect(mailChoicesInput.parse(form([]))).toEqual({ kinds: [] });
  });
});
