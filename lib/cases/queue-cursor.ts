/** Where a page of the second look's queue ended. */
export interface QueueCursor {
  atRiskCents: number;
  heldAt: number;
  id: number;
}

/** @example writeQueueCursor({ atRiskCents: 41200, heldAt: 5, id: 7 }) === "41200-5-7" */
export function writeQueueCursor({ atRiskCents, heldAt, id }: QueueCursor): string {
  return `${atRiskCents}-${heldAt}-${id}`;
}

/** The cursor in a URL. One that is not ours is no cursor: the first page. */
export function readQueueCursor(text: string | undefined): QueueCursor | null {
  const parts = /^(\d{1,15})-(\d{1,15})-(\d{1,15})$/.exec(text ?? "");
  return parts ? { atRiskCents: Number(parts[1]), heldAt: Number(parts[2]), id: Number(parts[3]) } : null;
}
