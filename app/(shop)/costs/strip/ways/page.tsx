import type { Metadata } from "next";
import { getDb } from "@/db/client";
import { listStripHistory } from "@/db/queries/strip-table";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { AddView } from "./add-view";
import { ChangeView } from "./change-view";
import { ListView } from "./list-view";

export const metadata: Metadata = { title: "Ways to strip" };

interface WaysPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

/** The shop's ways to take a deposit off. The address says what else: `way` changes one, `add` makes one. */
export default async function WaysPage({ searchParams }: WaysPageProps) {
  const query = await searchParams;
  const member = await guardPage("strips.set", routes.stripWays());
  if (query.add !== undefined) return <AddView member={member} />;
  if (typeof query.way === "string") {
    const rows = listStripHistory(getDb(), member.shopId).filter((row) => row.slug === query.way);
    const standing = rows[0];
    // Keyed: the form of another way begins afresh.
    if (standing) return <ChangeView key={standing.slug} member={member} standing={standing} rows={rows} />;
  }
  return <ListView member={member} />;
}
