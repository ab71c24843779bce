/** Where a page of jobs ended: when the last one was opened or closed, and its row number. */
export interface JobCursor {
  at: number;
  id: number;
}

/** @example writeJobCursor({ at: 5, id: 7 }) === "5-7" */
export const writeJobCursor = ({ at, id }: JobCursor): string => `${at}-${id}`;

/** The cursor in an address. One that is not ours is no cursor: the first page. */
export function readJobCursor(text: string | undefined): JobCursor | undefined {
  const parts = /^(\d{1,15})-(\d{1,15})$/.exec(text ?? "");
  return parts ? { at: Number(parts[1]), id: Number(parts[2]) } : undefined;
}
