/** The messages that a person may turn off. Invites and password resets always go out. */
export const MAIL_KINDS = ["second-look-waits", "case-confirmed"] as const;
export type MailKind = (typeof MAIL_KINDS)[number];

export const MAIL_KIND_TITLES: Record<MailKind, string> = {
  "second-look-waits": "A part waits for your second look",
  "case-confirmed": "Your part was confirmed",
};
