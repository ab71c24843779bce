/** Every address of the app that code links to, so that a renamed page breaks the types and not a link. */
export const routes = {
  today: () => "/",
  signIn: (from?: string) => (from ? `/sign-in?from=${encodeURIComponent(from)}` : "/sign-in"),
  forgotPassword: () => "/forgot-password",
  resetPassword: (token: string) => `/reset-password/${token}`,
  acceptInvite: (token: string) => `/invite/${token}`,
  snap: () => "/cases/snap",
  queue: (query?: Record<string, string>) => withQuery("/cases/second-look", query),
  secondLook: (ref: string, query?: Record<string, string>) => withQuery(`/cases/${ref}/second-look`, query),
  casebook: (query?: Record<string, string>) => withQuery("/cases", query),
  case: (ref: string) => `/cases/${ref}`,
  tag: (ref: string) => `/cases/${ref}/tag`,
  tagCode: (ref: string) => `/cases/${ref}/tag/code.svg`,
  jobs: (query?: Record<string, string>) => withQuery("/cases/jobs", query),
  reworkList: (query?: Record<string, string>) => withQuery("/cases/rework", query),
  rework: (ref: string) => `/cases/${ref}/rework`,
  reworkStep: (ref: string, step: number) => `/cases/${ref}/rework?step=${step}`,
  library: (query?: Record<string, string>) => withQuery("/library", query),
  libraryClass: (slug: string, query?: Record<string, string>) => withQuery(`/library/${slug}`, query),
  /** What the library's search is built from, in the browser. */
  libraryEntries: () => "/api/library/entries",
  /** What of the library answers these words, from the server. */
  libraryHits: (words: string) => withQuery("/api/library", { q: words }),
  practice: (query?: Record<string, string>) => withQuery("/practice", query),
  practiceProgress: (query?: Record<string, string>) => withQuery("/practice/progress", query),
  practiceDrills: () => "/practice/drills",
  practiceQuestion: (id: string) => `/practice/questions/${id}`,
  /** The photo of a question, for the person asked alone: its address tells nothing of photo or case. */
  practicePhoto: (id: string, size: "view" | "thumb") => `/api/practice/questions/${id}/photo?size=${size}`,
  libraryEdit: (entry: "class" | "cause" | "fix", slug: string, query?: Record<string, string>) =>
    withQuery(`/library/edit/${entry}/${slug}`, query),
  libraryNew: (entry: "class" | "cause" | "fix", query?: Record<string, string>) =>
    withQuery(`/library/edit/${entry}`, query),
  libraryRevisions: (entry: "class" | "cause" | "fix", slug: string, query?: Record<string, string>) =>
    withQuery(`/library/edit/${entry}/${slug}/revisions`, query),
  libraryPort: (query?: Record<string, string>) => withQuery("/library/port", query),
  /** The whole library as one file of the published format. */
  libraryExport: () => "/api/library/export",
  librarySchema: () => "/schemas/library-1.json",
  compare: (refs: readonly string[]) => withQuery("/cases/compare", { refs: refs.join(",") }),
  ledger: (query?: Record<string, string>) => withQuery("/costs", query),
  rates: () => "/costs/rates",
  strip: (query?: Record<string, string>) => withQuery("/costs/strip", query),
  stripWays: (query?: Record<string, string>) => withQuery("/costs/strip/ways", query),
  partCheck: (query?: Record<string, string>) => withQuery("/metals/check", query),
  metalRoutes: () => "/library/metals",
  metalRoute: (metal: string) => `/library/metals/${metal}`,
  crew: () => "/crew",
  audit: () => "/crew/audit",
  account: () => "/account",
  outbox: () => "/outbox",
  photo: (id: string, size: "thumb" | "view" | "original") => `/api/photos/${id}/${size}`,
} as const;

function withQuery(path: string, query?: Record<string, string>): string {
  const search = new URLSearchParams(query).toString();
  return search ? `${path}?${search}` : path;
}
