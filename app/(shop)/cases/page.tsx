import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { BesideProvider, BESIDE_FORM } from "@/components/cases/beside-picks";
import { BesideTray } from "@/components/cases/beside-tray";
import { CasebookBar } from "@/components/cases/casebook-bar";
import { CasebookChips } from "@/components/cases/casebook-chips";
import { CasebookForm } from "@/components/cases/casebook-form";
import { LeftOut, NoCase } from "@/components/cases/casebook-none";
import { CasebookReading } from "@/components/cases/casebook-reading";
import { CasebookSentence } from "@/components/cases/casebook-sentence";
import { CasebookTable } from "@/components/cases/casebook-table";
import { CasebookTag } from "@/components/cases/casebook-tag";
import { KeepSearch, SavedSearches } from "@/components/cases/saved-searches";
import { TagWire } from "@/components/cases/tag-wire";
import { LineStrip } from "@/components/line/line-strip";
import { NarrowedBar } from "@/components/line/narrowed-bar";
import type { MainAction } from "@/components/shell/main-action";
import { ShopShell } from "@/components/shell/shop-shell";
import { Pager } from "@/components/ui/pager";
import { Rests } from "@/components/ui/rests";
import { besideAddress, LEAST_BESIDE, readRefs } from "@/lib/cases/beside";
import { casebookAddress, readCasebookAddress } from "@/lib/cases/casebook-address";
import { cappedWords, casesWords } from "@/lib/cases/casebook-words";
import { routes } from "@/lib/routes";
import { guardPage } from "@/lib/server/session";
import { shellFor } from "@/lib/server/shell-data";
import { barProps, turned } from "./casebook-bar-props";
import { keepSearch, removeSearch, renameSearch } from "./saved-actions";
import { loadCasebook, trayCase, type LoadedCasebook } from "./load-casebook";

export const metadata: Metadata = { title: "Casebook" };

interface CasebookPageProps {
  searchParams: Promise<Record<string, string | string[] | undefined>>;
}

const SNAP: MainAction = { label: "Snap a suspect part", href: routes.snap(), glyph: "ui-camera", keyCap: "N" };
/** Photos of this many tags are in sight when the page opens. */
const EAGER = 4;

/** The casebook: every case of the shop, narrowed by a sentence that lives in the address. */
export default async function CasebookPage({ searchParams }: CasebookPageProps) {
  const params = await searchParams;
  const address = readCasebookAddress(params);
  const refs = readRefs(params.beside);
  const asked = routes.casebook({ ...casebookAddress(address.query), ...besideAddress(refs) });
  const member = await guardPage("case.see", asked);
  // A form without script sends its empty fields too. The address that people pass on has only what was asked.
  if (!address.isTidy) redirect(asked);
  const book = loadCasebook(member, address.query, refs, Date.now());
  const { query, names, count, all, items } = book;
  const { actor, counts, stations } = shellFor(member);
  const picked = book.tray.map((each) => each.ref);
  const to = (change: Parameters<typeof casebookAddress>[1]) =>
    routes.casebook({ ...casebookAddress(query, change), ...besideAddress(picked) });
  const chips = book.filters.map((filter) => ({
    filter,
    words: capital(names[filter] ?? ""),
    dropHref: to({ [filter]: null }),
  }));
  const clearHref = routes.casebook({ ...(query.view === "table" && { view: "table" }), ...besideAddress(picked) });
  return (
    <ShopShell
      actor={actor}
      counts={counts}
      here="casebook"
      main={items.length > 0 && picked.length >= LEAST_BESIDE ? compareAction(picked.length) : SNAP}
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
      <SavedSearches searches={book.saved} onRename={renameSearch} onRemove={removeSearch} />
      <div className="cb-top">
        <CasebookSentence
          count={count}
          names={names}
          below={chips.length > 0 ? `Of ${cappedWords(all)} in the book. The link keeps these words.` : undefined}
        />
        <CasebookForm
          query={query}
          choices={book.choices}
          beside={picked}
          reading={book.search && <CasebookReading terms={book.terms} isLoose={book.search.isLoose} />}
        />
      </div>
      <LeftOut names={[...address.left, ...book.unknown]} />
      {items.length === 0 ? (
        <NoCase chips={chips} clearHref={clearHref} isEmptyBook={all.count === 0} />
      ) : (
        <BesideProvider refs={picked} address={casebookAddress(query, { cursor: query.cursor })}>
          <CasebookChips chips={chips} clearHref={clearHref} label="Filters that are set" />
          {book.keepable && <KeepSearch query={book.keepable} onKeep={keepSearch} />}
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
          <BesideTray known={[...book.tray, ...items.map(trayCase)]} onPage={items.map((item) => item.ref)} />
        </BesideProvider>
      )}
    </ShopShell>
  );
}

/** While cases lie in the tray, comparing them is what the thumb bar does. */
const compareAction = (count: number): MainAction => ({
  label: `Compare ${count} in step`,
  form: BESIDE_FORM,
  glyph: "ui-step",
});

const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);

function Cases({ book, turnHref }: { book: LoadedCasebook; turnHref: string }) {
  const { items, terms, query } = book;
  const isPicked = (ref: string) => book.tray.some((each) => each.ref === ref);
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
          <CasebookTag key={item.ref} item={item} terms={terms} eager={index < EAGER} isBeside={isPicked(item.ref)} />
        ))}
      </TagWire>
    </div>
  );
}
