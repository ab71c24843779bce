import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Door } from "@/components/crew/door";
import { SignInForm } from "@/components/crew/sign-in-form";
import { Note } from "@/components/ui/note";
import { getDb } from "@/db/client";
import { hasDemoShop } from "@/db/queries/shops";
import { DEMO_PASSWORD, DEMO_SHOPS, DEMO_SIGN_INS } from "@/lib/crew/demo-sign-ins";
import { doorNote } from "@/lib/crew/door-words";
import { safePath } from "@/lib/crew/safe-path";
import { currentMember } from "@/lib/server/session";

export const metadata: Metadata = { title: "Sign in" };

interface SignInPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const asked = await searchParams;
  const first = (name: string) => (Array.isArray(asked[name]) ? asked[name][0] : asked[name]);
  const to = safePath(first("from"));
  if (await currentMember()) redirect(to);
  const note = doorNote(first("why"));
  return (
    <Door title="Sign in to your shop" picture="full">
      {note && (
        <Note tone="green" title={note.title} role="status">
          {note.words}
        </Note>
      )}
      <SignInForm to={to} code={first("error") ?? null} demo={demoSignIns()} />
    </Door>
  );
}

function demoSignIns() {
  if (!hasDemoShop(getDb())) return null;
  const groups = DEMO_SHOPS.map((shop) => ({
    shopName: shop.name,
    people: DEMO_SIGN_INS.filter((person) => person.shopSlug === shop.slug),
  }));
  return { password: DEMO_PASSWORD, groups };
}
