import { thumbHashToDataURL } from "thumbhash";

/**
 * The blurred picture that stands in a photo's place until it has loaded.
 * @param placeholder base64 of a thumb hash, as stored
 * @returns a data URL, or undefined when there is none
 */
export function placeholderUrl(placeholder: string | null): string | undefined {
  if (!placeholder) return undefined;
  return thumbHashToDataURL(Uint8Array.from(atob(placeholder), (letter) => letter.charCodeAt(0)));
}
