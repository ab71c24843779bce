import type { Role } from "@/lib/cases/case-words";

/** One password for every demo sign-in: the demo shops are invented and hold nothing worth guarding. */
export const DEMO_PASSWORD = "copper-strike-demo";

export interface DemoShop {
  slug: string;
  name: string;
}

export interface DemoSignIn {
  shopSlug: DemoShop["slug"];
  email: string;
  name: string;
  roles: readonly Role[];
}

/** The two invented shops. The second one exists to prove that nothing crosses. */
export const DEMO_SHOPS: readonly DemoShop[] = [
  { slug: "fernhollow", name: "Fernhollow Finishing" },
  { slug: "quarry-lane", name: "Quarry Lane Plating" },
];

/** Everybody who can sign in to a demo shop; the seed, the sign-in page and the README read them from here. */
export const DEMO_SIGN_INS: readonly DemoSignIn[] = [
  { shopSlug: "fernhollow", email: "tobias@fernhollow.example", name: "Tobias Lindqvist", roles: ["plater"] },
  { shopSlug: "fernhollow", email: "marisol@fernhollow.example", name: "Marisol Okafor", roles: ["plater"] },
  { shopSlug: "fernhollow", email: "petra@fernhollow.example", name: "Petra Salo", roles: ["plater", "senior"] },
  { shopSlug: "fernhollow", email: "ines@fernhollow.example", name: "Ines Varga", roles: ["senior"] },
  { shopSlug: "fernhollow", email: "dara@fernhollow.example", name: "Dara Moll", roles: ["trainee"] },
  { shopSlug: "fernhollow", email: "ruth@fernhollow.example", name: "Ruth Adeyemi", roles: ["owner"] },
  { shopSlug: "quarry-lane", email: "owner@quarrylane.example", name: "Jonas Brandt", roles: ["owner", "senior"] },
  { shopSlug: "quarry-lane", email: "plater@quarrylane.example", name: "Aiko Tan", roles: ["plater"] },
];
