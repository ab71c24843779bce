import { shelf } from "@/db/seed/library/shelf";
import type { Shelf } from "@/lib/library/library-entry";

/**
 * The shelf that ships with this version of the product. A shop got the one of its day; what it lacks of this one it may bring
 * in, and no entry of its own may take a slug of it.
 */
export const shippedShelf: Shelf = shelf;
