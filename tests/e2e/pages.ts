import type { Person } from "./people";

/** Every screen, with somebody who may see it: opened for accessibility, by day and on night shift. */
export interface Screen {
  path: string;
  as: Person | null;
}

/** `{held}`, `{card}` and `{closed}` stand for the reference of a case in that state. */
export const SCREENS: readonly Screen[] = [
  { path: "/gallery", as: null },
  { path: "/sign-in", as: null },
  { path: "/forgot-password", as: null },
  { path: "/", as: "plater" },
  { path: "/", as: "senior" },
  { path: "/", as: "owner" },
  { path: "/", as: "trainee" },
  { path: "/cases/snap", as: "plater" },
  { path: "/cases", as: "senior" },
  { path: "/cases?view=table", as: "owner" },
  { path: "/cases?q=nothing-like-this", as: "trainee" },
  { path: "/cases/{held}", as: "senior" },
  { path: "/cases/{closed}", as: "owner" },
  { path: "/cases/{held}/tag", as: "plater" },
  { path: "/cases/second-look", as: "senior" },
  { path: "/cases/{held}/second-look", as: "senior" },
  { path: "/cases/rework", as: "plater" },
  { path: "/cases/{card}/rework", as: "plater" },
  { path: "/cases/jobs", as: "senior" },
  { path: "/cases/jobs?open=1", as: "plater" },
  { path: "/library", as: "trainee" },
  { path: "/library/underactivation", as: "trainee" },
  { path: "/library/sound", as: "plater" },
  { path: "/library/metals", as: "trainee" },
  { path: "/library/metals/steel", as: "plater" },
  { path: "/library/metals/aluminium", as: "trainee" },
  { path: "/costs", as: "owner" },
  { path: "/costs/rates", as: "owner" },
  { path: "/costs/strip/ways", as: "owner" },
  { path: "/costs/strip/ways?way=nickel-sulfuric-anodic", as: "owner" },
  { path: "/costs/strip/ways?add=1", as: "owner" },
  { path: "/crew", as: "owner" },
  { path: "/crew/audit", as: "owner" },
  { path: "/outbox", as: "owner" },
  { path: "/account", as: "plater" },
];
