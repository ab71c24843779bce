import type { TextPart } from "@/lib/cases/matched-words";

/** A text with what a search found in it marked. */
export function MarkedParts({ parts }: { parts: readonly TextPart[] }) {
  return parts.map((part, index) =>
    part.isMatch ? <mark key={index}>{part.text}</mark> : <span key={index}>{part.text}</span>,
  );
}
