import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { CasebookBar } from "@/components/cases/casebook-bar";
import { CasebookChips } from "@/components/cases/casebook-chips";
import { CasebookForm } from "@/components/cases/casebook-form";
import { LeftOut, NoCase } from "@/components/cases/casebook-none";
import { CasebookReading } from "@/components/cases/casebook-reading";
import { CasebookSentence } from "@/components/cases/casebook-sentence";
import { CasebookTable } from "@/components/cases/casebook-table";
import { CasebookTag } from "@/components/cases/casebook-tag";
import { TagWire } from "@/components/cases/tag-wire";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Pager } from "@/components/ui/pager";
import { Rests } from "@/components/ui/rests";
import { casebookAddress, readCasebookAddress } from "@/lib/cases/casebook-address";
import { cappedWords, casesWords } from "@/lib/cases/casebook-words";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { barProps, turned } from "./casebook-bar-props";
import { loadCasebook, type LoadedCasebook } from "./load-casebook";

export const metadata: Metadata = { title: "Casebook" };

interface CasebookPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const SNAP: MainAction = { label: "Snap a suspect part", href: routes.snap(), glyph: "ui-camera", keyCap: "N" };
/** Photos of this many tags are in sight when the page opens. */
const EAGER = 4;

/** The casebook: every case of the shop, narrowed by a sentence that lives in the address. */
export default async function CasebookPage({ searchParams }: CasebookPageProps) {
  const address = readCasebookAddress(await searchParams);
  const member = await guardPage("case.see", routes.casebook(casebookAddress(address.query)));
  // A form without script sends its empty fields too. The address that people pass on has only what was asked.
  if (!address.isTidy) redirect(routes.casebook(casebookAddress(address.query)));
  const book = loadCasebook(member, address.query, Date.now());
  const { query, names, count, all, items } = book;
  const { actor, counts, stations } = shellFor(member);
  const to = (change: Parameters<typeof casebookAddress>[1]) => routes.casebook(casebookAddress(query, change));
  const chips = book.filters.map((filter) => ({
    filter,
    words: capital(names[filter] ?? ""),
    dropHref: to({ [filter]: null }),
  }));
  const clearHref = routes.casebook(query.view === "table" ? { view: "table" } : undefined);
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      main={SNAP}
      strip={
        <LineStrip
          mode="full"
          stations={stations}
          pressed={query.station ?? null}
          hrefFor={(station) => to({ station })}
        />
      }
      narrowed={
        names.station && (
          <NarrowedBar
            station={names.station}
            words={casesWords(count).toLowerCase()}
            clearHref={to({ station: null })}
          />
        )
      }
    >
      <div className="cb-top">
        <CasebookSentence
          count={count}
          names={names}
          below={chips.length > 0 ? `Of ${cappedWords(all)} in the book. The link keeps these words.` : undefined}
        />
        <CasebookForm
          query={query}
          choices={book.choices}
          reading={book.search && <CasebookReading terms={book.terms} isLoose={book.search.isLoose} />}
        />
      </div>
      <LeftOut names={[...address.left, ...book.unknown]} />
      {items.length === 0 ? (
        <NoCase chips={chips} clearHref={clearHref} isEmptyBook={all.count === 0} />
      ) : (
        <>
          <CasebookChips chips={chips} clearHref={clearHref} label="Filters that are set" />
          <CasebookBar {...barProps(book, to)} />
          <Cases book={book} turnHref={to({ order: turned(book) })} />
          {(book.next || book.previous) && (
            <Pager
              label="Cases"
              words={`${items.length} of ${cappedWords(count)} on this page`}
              nextHref={book.next && to({ cursor: book.next })}
              previousHref={book.previous && to({ cursor: book.previous })}
            />
          )}
        </>
      )}
    </ShopShell>
  );
}

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

function Cases({ book, turnHref }: { book: LoadedCasebook; turnHref: string }) {
  const { items, terms, query } = book;
  if (query.view === "table") {
    return (
      <>
        <CasebookTable items={items} terms={terms} time={{ ...book.time, turnHref }} withMoney={book.withMoney} />
        <Rests>
          Minutes as they were ticked on the cards.
          {book.withMoney && " Cost as recorded, at the rates of the day; before a card is done, the estimate."}
        </Rests>
      </>
    );
  }
  return (
    <div className="cb">
      <TagWire layout="rack" label="Cases">
        {items.map((item, index) => (
          <CasebookTag key={item.ref} item={item} terms={terms} eager={index < EAGER} />
        ))}
      </TagWire>
    </div>
  );
}
