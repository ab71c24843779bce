/** A stretch of a mail's text: words, or an address that can be pressed. */
export type TextPart = { kind: "words"; words: string } | { kind: "link"; href: string };

const ADDRESS = /(https?:\/\/[^\s<>"]+)/;

/**
 * Plain text with its addresses set apart, as a mail reader shows them.
 * @example textParts("Open\nhttps://a.example/x") is words "Open\n", then the link
 */
export function textParts(text: string): TextPart[] {
  return text
    .split(ADDRESS)
    .filter((part) => part !== "")
    .map((part): TextPart => (ADDRESS.test(part) ? { kind: "link", href: part } : { kind: "words", words: part }));
}
