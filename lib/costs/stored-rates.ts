import type { ShopRates } from "./rates";

/**
 * A shop's rates as one dated row holds them; the date is the row's own column. `source` says where the figures come
 * from and is shown wherever a cost rests on them.
 */
export type StoredRates = Omit<ShopRates, "validFromAt"> & { source: string };
