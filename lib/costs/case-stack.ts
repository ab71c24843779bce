import { USUAL_STRIKE_UM, type Layer } from "@/lib/plating/deposit-stack";

/**
 * A job's whole deposit from the base out: the copper strike at its usual thickness, then the layers that the job orders.
 * @param finalStack layers still to come after the strike, in order
 */
export function strikeThenPlate(finalStack: readonly Layer[]): Layer[] {
  return [{ metal: "Cu", thicknessUm: USUAL_STRIKE_UM }, ...finalStack];
}
