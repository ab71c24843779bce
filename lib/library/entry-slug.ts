/** Words that stand where a class's slug would in an address of the library. */
export const RESERVED_SLUGS = ["metals", "edit", "port", "entries", "export", "import", "new", "revisions"] as const;

/** Room for a number behind it, and for every address and filter that names an entry (60). */
const MOST_LETTERS = 48;

/**
 * The name of a new entry in addresses and links, from its title; never one that is taken or that the library's own
 * addresses use.
 * @param taken slugs that the shop or the shelf has, of entries that were removed too
 * @example entrySlug("Smoky edges", new Set()) === "smoky-edges"
 * @example entrySlug("Edit", new Set()) === "edit-2"
 */
export function entrySlug(title: string, taken: ReadonlySet<string>): string {
  const stem =
    title
      .normalize("NFKD")
      .replace(/\p{M}+/gu, "")
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, "-")
      .slice(0, MOST_LETTERS)
      .replace(/^-+|-+$/g, "") || "entry";
  const isFree = (slug: string) => !taken.has(slug) && !RESERVED_SLUGS.some((word) => word === slug);
  let slug = stem;
  for (let number = 2; !isFree(slug); number += 1) slug = `${stem}-${number}`;
  return slug;
}
