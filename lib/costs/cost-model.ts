/**
 * The version of the cost estimate. Raise it whenever a change of the arithmetic, of the usual times or of the ways to
 * strip that ship moves the figure of any case: at the next start every shop that was priced with an earlier version has
 * all its cases priced again, at the rates and with the table of their day; recorded minutes stay.
 *
 * 1: ways to strip from the shop's own table, minutes corrected by the shop's own record.
 * 2: at the strike too the cheapest safe way, where that is not polishing back.
 */
export const COST_MODEL = 2;
