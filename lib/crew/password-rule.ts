import { CREW_LIMITS } from "./crew-limits";

/**
 * Long passwords that guessers try first, in lower case without spaces. Shorter ones fall to the length already.
 * Source: from memory of published lists of the most used passwords, doubled or padded to twelve characters.
 */
const COMMON = new Set([
  "123456789012",
  "1234567890123",
  "123456123456",
  "1234567890qwerty",
  "1q2w3e4r5t6y",
  "1qaz2wsx3edc",
  "abc123abc123",
  "abcdefghijkl",
  "administrator",
  "changemenow1",
  "correcthorsebatterystaple",
  "electroplating",
  "iloveyou1234",
  "letmein12345",
  "letmeinletmein",
  "password1234",
  "password12345",
  "password123456",
  "passwordpassword",
  "qwerty123456",
  "qwertyqwerty",
  "qwertyuiop12",
  "qwertyuiop123",
  "qwertyuiopasdf",
  "trustno1trustno1",
  "welcome12345",
  "welcomewelcome",
]);

/**
 * What is wrong with a new password, as a sentence that says what to do.
 * Length, common ones and one's own e-mail, after NIST SP 800-63B section 5.1.1.2 (from memory); no rule about digits
 * or signs, which that source advises against.
 * @returns null when it will do
 * @example passwordFault("twelve chars and more", "ruth@fernhollow.example") === null
 */
export function passwordFault(password: string, email: string): string | null {
  if (password.length < CREW_LIMITS.passwordLeastChars) {
    return `Use at least ${CREW_LIMITS.passwordLeastChars} characters. Four plain words do well.`;
  }
  if (password.length > CREW_LIMITS.passwordMostChars) {
    return `Use at most ${CREW_LIMITS.passwordMostChars} characters.`;
  }
  const plain = password.toLowerCase().replace(/\s/g, "");
  if (COMMON.has(plain) || new Set(plain).size < 4) {
    return "That one is among the first that guessers try. Choose another.";
  }
  const whole = email.toLowerCase();
  const [name = ""] = whole.split("@");
  // What is left once the person's own e-mail is taken out must still be worth guessing.
  const rest = name.length >= 4 ? plain.replaceAll(whole, "").replaceAll(name, "") : plain.replaceAll(whole, "");
  if (rest.length < 6) return "Your e-mail and a few signs are soon guessed. Choose another.";
  return null;
}
