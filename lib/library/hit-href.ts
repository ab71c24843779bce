import { routes } from "@/lib/routes";
import type { LibraryHit } from "./library-hit";

/** Where a hit leads: a class to its page; a cause or fix to its place on the page of the class that it shows as most. */
export function hitHref(hit: Pick<LibraryHit, "slug" | "kind" | "classes">): string {
  if (hit.kind === "class") return routes.libraryClass(hit.slug);
  const owner = hit.classes[0];
  return owner ? `${routes.libraryClass(owner)}#${entryAnchor(hit.kind, hit.slug)}` : routes.library();
}

/** The id of a cause or fix on its class's page. */
export function entryAnchor(kind: "cause" | "fix", slug: string): string {
  return `${kind}-${slug}`;
}
