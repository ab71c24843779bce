/** Where a page of cards ended: the last card's time and case. */
export interface CardCursor {
  madeAt: number;
  caseId: number;
}

/** @example writeCursor({ madeAt: 5, caseId: 7 }) === "5-7" */
export function writeCursor({ madeAt, caseId }: CardCursor): string {
  return `${madeAt}-${caseId}`;
}

/** The cursor in a URL. One that is not ours is no cursor: the first page. */
export function readCursor(text: string | undefined): CardCursor | undefined {
  const parts = /^(\d{1,15})-(\d{1,15})$/.exec(text ?? "");
  return parts ? { madeAt: Number(parts[1]), caseId: Number(parts[2]) } : undefined;
}
