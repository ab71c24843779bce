import { DEMO_PASSWORD, DEMO_SHOPS, DEMO_SIGN_INS } from "@/lib/crew/demo-sign-ins";

for (const person of DEMO_SIGN_INS) {
  const shop = DEMO_SHOPS.find((each) => each.slug === person.shopSlug)?.name ?? "";
  console.log(`  ${person.email.padEnd(34)} ${person.roles.join(" + ").padEnd(16)} ${person.name}, ${shop}`);
}
console.log(`  password for all: ${DEMO_PASSWORD}   (invented people, demo data)`);
