/** The one place that gathers the tables, because Drizzle wants them in one object. */
export * from "./crew";
export * from "./line";
export * from "./library";
export * from "./cases";
export * from "./photos";
export * from "./costs";
export * from "./metals";
export * from "./practice";
export * from "./server";
