import type { Metadata } from "next";
import Link from "next/link";
import { redirect } from "next/navigation";
import { CompareBoard } from "@/components/cases/compare-board";
import { TellsBetweenList } from "@/components/library/tells-between";
import { ShopShell } from "@/components/shell/shop-shell";
import { LinkButton } from "@/components/ui/button";
import { Empty } from "@/components/ui/empty";
import { Lead } from "@/components/ui/lead";
import { Note } from "@/components/ui/note";
import { Section } from "@/components/ui/section";
import { getDb } from "@/db/client";
import { besideAddress, LEAST_BESIDE, readRefs } from "@/lib/cases/beside";
import { differWords } from "@/lib/cases/compare-facts";
import { countWords } from "@/lib/cases/part-words";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { loadCompare, type LoadedCompare } from "./load-compare";

export const metadata: Metadata = { title: "Side by side" };

interface ComparePageProps {
  searchParams: Promise<{ refs?: string | string[] }>;
}

/** Two to four cases side by side: photos in step, facts, and what tells their classes apart. */
export default async function ComparePage({ searchParams }: ComparePageProps) {
  const asked = (await searchParams).refs;
  const refs = readRefs(asked);
  const member = await guardPage("case.see", routes.compare(refs));
  // The tray sends one field a case; the address that people pass on has them in one.
  if (Array.isArray(asked)) redirect(routes.compare(refs));
  const loaded = loadCompare(getDb(), member.shopId, refs, Date.now());
  const { actor, counts } = shellFor(member);
  const changeHref = routes.casebook(besideAddress(loaded.columns.map((column) => column.ref)));
  return (
    <ShopShell actor={actor} counts={counts} here="casebook" main={null} back={changeHref}>
      <nav className="crumb" aria-label="Casebook">
        <Link href={changeHref}>Casebook</Link>
      </nav>
      {loaded.missing.length > 0 && (
        <Note tone="amber" title={`This shop has no case ${loaded.missing.join(", ")}`}>
          The others are below. Check the reference on the tag.
        </Note>
      )}
      {loaded.columns.length < LEAST_BESIDE ? (
        <TooFewPicked href={changeHref} count={loaded.columns.length} />
      ) : (
        <Compared loaded={loaded} changeHref={changeHref} />
      )}
    </ShopShell>
  );
}

function TooFewPicked({ href, count }: { href: string; count: number }) {
  return (
    <>
      <Lead size="page">Side by side</Lead>
      <Empty
        title={count === 0 ? "No case is picked." : "One case is picked."}
        level={2}
        action={<LinkButton href={href}>Pick cases</LinkButton>}
      >
        Tick “Set beside” on two to four tags of the casebook.
      </Empty>
    </>
  );
}

function Compared({ loaded, changeHref }: { loaded: LoadedCompare; changeHref: string }) {
  const { columns, rows, tells } = loaded;
  return (
    <>
      <Lead size="page" below={differWords(rows)}>
        {leadWords(loaded)}
      </Lead>
      <CompareBoard
        columns={columns}
        rows={rows}
        changeHref={changeHref}
        key={columns.map((each) => each.ref).join()}
      />
      {tells.length > 0 && (
        <Section title="What tells them apart" id="tells" rests="From the library's pages, where the sources stand.">
          <TellsBetweenList pairs={tells} />
        </Section>
      )}
    </>
  );
}

/** "Underactivation beside dewetting", or how many cases there are of one class. */
function leadWords({ columns, titles }: LoadedCompare): string {
  const [first = "", second] = titles;
  const number = countWords(columns.length);
  if (second === undefined)
    return `${number.charAt(0).toUpperCase()}${number.slice(1)} cases of ${first.toLowerCase()}`;
  if (titles.length === 2) return `${first} beside ${second.toLowerCase()}`;
  return `${number.charAt(0).toUpperCase()}${number.slice(1)} cases, ${countWords(titles.length)} classes`;
}
