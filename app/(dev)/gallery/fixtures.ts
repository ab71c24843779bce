import type { StationView } from "@/lib/line/station-view";
import type { TagProps } from "@/components/cases/tag";

/** Plain props for the gallery: no database, no clock. The figures are made up. */
export const ACTOR = {
  name: "Ines Varga",
  initials: "IV",
  roles: ["senior", "owner"] as const,
  shopName: "Fernhollow Finishing",
};

export const STATIONS: StationView[] = [
  { slug: "clean", name: "Clean", kind: "clean", note: "day 6 of 14", level: 0.72, age: 0.4, held: 0 },
  { slug: "rinse-1", name: "Rinse", kind: "rinse", note: "9 µS/cm", level: 1, age: 0, flowing: true, held: 2 },
  {
    slug: "activate",
    name: "Activate",
    kind: "activate",
    note: "5 days over",
    over: true,
    level: 0,
    age: 1.2,
    held: 15,
  },
  { slug: "rinse-2", name: "Rinse", kind: "rinse", note: "14 µS/cm", level: 1, age: 0, flowing: true, held: 1 },
  { slug: "strike", name: "Strike", kind: "strike", note: "54 °C 0.8 V", level: 0.8, age: 0.25, held: 3 },
  { slug: "inspect", name: "Inspect", kind: "inspect", note: "6 cases wait", level: 1, age: 0, held: 0 },
  { slug: "plate", name: "Plate", kind: "plate", note: "day 31 of 90", level: 0.7, age: 0.33, held: 0 },
  { slug: "finish", name: "Finish", kind: "finish", note: "oven 190 °C", level: 1, age: 0, held: 0 },
];

const DRAWN_PART = `data:image/svg+xml,${encodeURIComponent(
  '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 120 90"><rect width="120" height="90" fill="#8f969a"/><circle cx="60" cy="45" r="30" fill="none" stroke="#c9743f" stroke-width="16"/><path d="M38 28a28 28 0 0 1 20-11" stroke="#b9b06a" stroke-width="12" fill="none"/></svg>',
)}`;
export const PHOTO = { src: DRAWN_PART, alt: "" };

export const TAGS: TagProps[] = [
  {
    caseRef: "CT-2607-0042",
    state: "held",
    stateWords: "Held 38 min",
    classSlug: "underactivation",
    classWords: "Underactivation?",
    meta: "3 shells, at strike",
    photo: PHOTO,
    href: "#held",
  },
  {
    caseRef: "CT-2607-0040",
    state: "confirmed",
    stateWords: "Confirmed",
    classSlug: "dewetting",
    classWords: "Dewetting",
    meta: "6 pins, card ready",
    href: "#confirmed",
  },
  {
    caseRef: "CT-2607-0038",
    state: "in-rework",
    stateWords: "Step 3 of 5",
    classSlug: "water-spots",
    classWords: "Water spots",
    meta: "4 brackets. The teeth fill as steps are ticked",
    progress: 0.6,
    href: "#in-rework",
  },
  {
    caseRef: "CT-2606-0117",
    state: "closed-sound",
    stateWords: "Closed, sound",
    classSlug: "underactivation",
    classWords: "Underactivation",
    meta: "12 shells. The stub is torn off",
    href: "#closed",
  },
  {
    caseRef: "CT-2605-0060",
    state: "scrap",
    stateWords: "Closed, scrap",
    classSlug: "burning",
    classWords: "Burning",
    meta: "2 rotors, after the final plate",
    href: "#scrap",
  },
  {
    caseRef: "CT-2606-0102",
    state: "concession",
    stateWords: "Closed, concession",
    classSlug: "handling",
    classWords: "Handling",
    meta: "1 bar. Customer agreed 19 Jun",
    href: "#concession",
  },
  {
    caseRef: "CT-2606-0099",
    state: "regrade",
    stateWords: "Closed, regrade",
    classSlug: "tumble-scuff",
    classWords: "Tumble scuff",
    meta: "A class of the shop's own",
    href: "#regrade",
  },
  {
    caseRef: "CT-2607-0035",
    state: "released",
    stateWords: "Released, sound",
    classSlug: "sound",
    classWords: "Sound",
    meta: "False alarm. No manila, dashed end",
    href: "#released",
  },
  {
    caseRef: "CT-2607-0044",
    state: "held",
    stateWords: "Round 2, 2 h 05 min",
    classSlug: null,
    classWords: "Can't tell: dark under the copper near the weld seam",
    meta: "48 of 480 connector housings, nickel silver C75700, second half of the morning's run after the filter change",
    stake: "$12,412",
    photo: PHOTO,
    href: "#crowded",
  },
];
