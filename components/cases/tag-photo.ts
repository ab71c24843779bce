import type { TagPhoto } from "@/components/cases/tag";
import { placeholderUrl } from "@/components/photos/placeholder-url";
import type { PhotoState } from "@/lib/photos/photo-words";
import { routes } from "@/lib/routes";

/** The photo on a case's tag: none until it is ready. Its alt is empty because the tag's own words say all of it. */
export function tagPhoto(
  photo: { id: string; state: PhotoState; placeholder: string | null } | undefined,
): TagPhoto | undefined {
  if (photo?.state !== "ready") return undefined;
  return { src: routes.photo(photo.id, "thumb"), alt: "", placeholder: placeholderUrl(photo.placeholder) };
}
