import { DEMO_PASSWORD, DEMO_SIGN_INS } from "@/lib/crew/demo-sign-ins";

for (const person of DEMO_SIGN_INS) {
  console.log(`  ${person.email.padEnd(34)} ${person.roles.join(" + ").padEnd(16)} ${person.name}, ${person.shopName}`);
}
console.log(`  password for all: ${DEMO_PASSWORD}   (invented people, demo data)`);
