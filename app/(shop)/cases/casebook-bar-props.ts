import type { casebookAddress } from "@/lib/cases/casebook-address";
import type { LoadedCasebook } from "./load-casebook";

type Change = Parameters<typeof casebookAddress>[1];

/** The order that a press on "sort" asks for. */
export function turned(book: LoadedCasebook): "newest" | "oldest" {
  return book.time.sorted === "descending" ? "oldest" : "newest";
}

/** What the bar over the cases says and links to. */
export function barProps(book: LoadedCasebook, to: (change: Change) => string) {
  const { query, time } = book;
  const words =
    time.column === "closed" ? ["Last closed first", "First closed first"] : ["Newest first", "Oldest first"];
  const [newest = "", oldest = ""] = words;
  const best = book.search?.isCapped ? "The 200 best matches" : "Best match first";
  return {
    view: query.view ?? ("grid" as const),
    gridHref: to({ view: null, cursor: query.cursor }),
    tableHref: to({ view: "table", cursor: query.cursor }),
    orderWords: time.sorted === undefined ? best : time.sorted === "descending" ? newest : oldest,
    turnWords: time.sorted === "descending" ? oldest : newest,
    turnHref: to({ order: turned(book) }),
    isRendered: book.items.some((item) => item.before?.isRendered || item.after?.isRendered),
  };
}
