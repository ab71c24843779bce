const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const DAY_MS = 24 * HOUR_MS;

/**
 * How long things last and how often they may be tried.
 * Password length after NIST SP 800-63B section 5.1.1.2, which asks for at least 8 and for room for long ones (from
 * memory); the other figures are our own choice.
 */
export const CREW_LIMITS = {
  passwordLeastChars: 12,
  passwordMostChars: 256,
  /** Longest path that SMTP carries: RFC 5321 section 4.5.3.1.3, less the two brackets. */
  emailChars: 254,
  inviteMs: 7 * DAY_MS,
  resetMs: HOUR_MS,
  /** Reset mails to one person within `resetMs`; more would only fill their mailbox. */
  resetsAtOnce: 3,
  sessionMs: 30 * DAY_MS,
  signInWindowMs: 15 * MINUTE_MS,
  signInTriesPerEmail: 8,
  signInTriesPerAddress: 40,
  digestMs: 10 * MINUTE_MS,
} as const;
