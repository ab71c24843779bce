/** A line of a message: words, or words with the address that they lead to. */
export type MailLine = string | { words: string; link: string };

/**
 * A message's two forms: plain text with the address under its words, and simple HTML with the same words.
 * Names and notes come from people, so every word is escaped.
 */
export function mailBody(lines: readonly MailLine[]): { text: string; html: string } {
  const text = lines.map((line) => (typeof line === "string" ? line : `${line.words}\n${line.link}`)).join("\n\n");
  const paragraphs = lines.map((line) =>
    typeof line === "string"
      ? `<p>${escapeHtml(line)}</p>`
      : `<p><a href="${escapeHtml(line.link)}">${escapeHtml(line.words)}</a></p>`,
  );
  return {
    text: `${text}\n`,
    html: `<!doctype html><html lang="en"><body style="font:17px/1.5 sans-serif;color:#13202e">${paragraphs.join("")}</body></html>`,
  };
}

/** @example escapeHtml('<b>"Ines"</b>') === "&lt;b&gt;&quot;Ines&quot;&lt;/b&gt;" */
export function escapeHtml(words: string): string {
  const marks: Record<string, string> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };
  return words.replace(/[&<>"']/g, (mark) => marks[mark] ?? mark);
}
