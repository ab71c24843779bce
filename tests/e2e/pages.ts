import type { Person } from "./people";

/** Every screen, with somebody who may see it: opened for accessibility, by day and on night shift. */
export interface Screen {
  path: string;
  as: Person | null;
}

/** `{held}`, `{card}` and `{closed}` stand for the reference of a case in that state; `{question}` for a practice question. */
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
  { path: "/metals/check", as: "plater" },
  {
    path: "/metals/check?air=48.6&water=41.3&temp=22&error=0.1&pull=none&colour=blue-grey",
    as: "trainee",
  },
  { path: "/metals/check?air=41.3&water=48.6&temp=20&error=0.1", as: "senior" },
  { path: "/library", as: "trainee" },
  { path: "/library/underactivation", as: "trainee" },
  { path: "/library/sound", as: "plater" },
  { path: "/library/metals", as: "trainee" },
  { path: "/library/metals/steel", as: "plater" },
  { path: "/library/metals/aluminium", as: "trainee" },
  { path: "/practice", as: "trainee" },
  { path: "/practice/questions/{question}", as: "trainee" },
  { path: "/practice/progress", as: "trainee" },
  { path: "/practice/progress", as: "senior" },
  { path: "/practice/drills", as: "senior" },
  { path: "/costs", as: "owner" },
  { path: "/costs/rates", as: "owner" },
  { path: "/costs/strip", as: "owner" },
  { path: "/costs/strip?case={held}", as: "senior" },
  {
    path: "/costs/strip?parts=12&area=0.62&value=610&base=brass&metal1=Cu&thickness1=1&metal2=Ni&thickness2=5&metal3=Au&thickness3=0.6&to3=1.2",
    as: "senior",
  },
  { path: "/costs/strip?parts=0&area=x&base=cheese&metal1=Au&thickness1=&shape=tube&length=-1", as: "senior" },
  { path: "/costs/strip/ways", as: "owner" },
  { path: "/costs/strip/ways?way=nickel-sulfuric-anodic", as: "owner" },
  { path: "/costs/strip/ways?add=1", as: "owner" },
  { path: "/crew", as: "owner" },
  { path: "/crew/audit", as: "owner" },
  { path: "/outbox", as: "owner" },
  { path: "/account", as: "plater" },
];
