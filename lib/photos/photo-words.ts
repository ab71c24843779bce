/** What a photo is for. */
export const PHOTO_PURPOSES = ["suspect", "re-strike"] as const;
export type PhotoPurpose = (typeof PHOTO_PURPOSES)[number];

/**
 * `awaited`: the snap named it, the file has not come in yet. `processing`: accepted and safe, sizes are being made.
 * `ready`: all sizes stand. `refused`: could not be kept; `refusal` says why.
 */
export const PHOTO_STATES = ["awaited", "processing", "ready", "refused"] as const;
export type PhotoState = (typeof PHOTO_STATES)[number];

export const PHOTO_SIZES = ["thumb", "view", "original"] as const;
export type PhotoSize = (typeof PHOTO_SIZES)[number];
