/** Seen only once the final plate is on: what comes off, what stays on, and where the part goes back into the line. */
import type { LibraryFix } from "@/lib/library/library-entry";
import {
  activate,
  beforeStripping,
  clean,
  photographAndTape,
  polishBack,
  rinse,
  strike,
} from "@/db/seed/library/steps";

const STRIP_CAUTIONS = ["acid-splash", "acid-cyanide", "power", "nickel", "sheet", "waste"];

export const fixesAfterFinalPlate: LibraryFix[] = [
  {
    slug: "strip-final-plate-steel",
    causeSlugs: ["cleaner-spent", "oil-skin", "activator-spent", "flash-rust", "strike-thin-or-porous"],
    title: "After the final plate, steel: strip nickel and copper to bare steel, start again",
    steps: [
      beforeStripping({
        detail:
          "Gold, palladium or rhodium on top comes off first by its own strip. Gauge threads and fits; lift one blister: copper on its back with bright steel below names the strike.",
        cautionKeys: ["embrittlement"],
      }),
      {
        title: "Nickel off, anodic in strong sulfuric",
        detail:
          "Rinsed of cyanide and dried, then about 625 mL/L sulfuric at 6 V, lead cathodes, part anodic (trade column). Water let in pits the steel. It slows at the copper: out then.",
        minutes: 20,
        perPart: false,
        cautionKeys: [...STRIP_CAUTIONS, "embrittlement", "lead-dust"],
        station: null,
      },
      {
        title: "Copper off in ammonium persulfate",
        detail:
          "Three rinses to neutral. 60 to 120 g/L with ammonia, pH 9 to 10, 20 to 30 °C, until no pink shows in any recess.",
        minutes: 8,
        perPart: false,
        cautionKeys: ["persulfate", "sheet", "waste"],
        station: null,
      },
      clean("Anodic electroclean, loupe", {
        detail: "2 to 3 min. Etch lines or pits under the loupe: refinish before the line, or ask the senior.",
        minutes: 6,
      }),
      activate("Short acid, then the card of the cause", {
        detail:
          "Stripped steel is active already: 5 to 10 s. From here the cause's own card says what to do otherwise.",
      }),
      strike({ detail: "Photograph and tape every part before any nickel goes on: this one has cost its money once." }),
    ],
    whenNot:
      "Not hardened or spring steel without an engineer, and not when the fault is in the nickel alone: copper that holds all round may stay on.",
    materials: ["sulfuric strip", "ammonium persulfate", "gauges", "lead cathodes"],
    sourceKeys: ["strip-columns", "astm-b850", "common-practice", "from-memory"],
  },
  {
    slug: "strip-final-plate-copper-alloy",
    causeSlugs: ["buffing-compound-left", "activator-dwell-short", "leaded-alloy-smut", "activator-dwell-long"],
    title: "After the final plate, brass or copper: take nickel down to the copper, polish, strike again",
    steps: [
      beforeStripping({
        detail:
          "Gold or palladium first, by its own strip: cyanide with peroxide eats brass. Read the alloy: leaded brass goes black in most nickel strips.",
        cautionKeys: ["cyanide"],
      }),
      {
        title: "Nickel off in a strip made for copper alloys",
        detail:
          "A maker's immersion strip, or the anodic sulfuric one at 6 V watched all the time. Out at the first even pink; brass below has no clock of its own.",
        minutes: 25,
        perPart: false,
        cautionKeys: [...STRIP_CAUTIONS, "embrittlement"],
        station: null,
      },
      polishBack({
        detail: "What is left of the strike and the black below it, wet, until the alloy's own colour is even.",
        minutes: 12,
        cautionKeys: ["lead-dust", "nickel"],
      }),
      clean("Compound soak, then electroclean", {
        detail: "Fresh polish means fresh compound. Cathodic, with 5 s anodic to end.",
        minutes: 9,
      }),
      activate("The alloy's own dip", {
        detail:
          "Sulfuric for plain brass and copper; the leaded card's acid for leaded. Half the time: polished metal needs less.",
      }),
      strike({ detail: "Wet in. Read the letters and threads with a lamp before anything follows." }),
    ],
    whenNot:
      "Not steel, and not thin or engraved work with no metal to polish: price it, and ask for a concession first.",
    materials: ["nickel strip for copper alloys", "fine wet paper", "compound remover"],
    sourceKeys: ["astm-b281", "strip-columns", "common-practice", "from-memory"],
  },
  {
    slug: "strip-final-plate-zinc",
    causeSlugs: ["zinc-casting-skin-trapped", "zinc-or-aluminium-attacked", "dead-entry"],
    title: "After the final plate, zinc die cast: strip to the copper and stop there",
    steps: [
      beforeStripping({
        detail:
          "Open one blister. Grip lost between copper and zinc: the part is scrap or the customer's choice, no strip mends it. Grip lost between nickel and copper: go on.",
      }),
      {
        title: "Nickel off, dry anodic sulfuric",
        detail:
          "Part bone dry into strong sulfuric, 6 V, cold. Seconds after even pink shows it must be out: through the copper, zinc fizzes and is lost.",
        minutes: 15,
        perPart: false,
        cautionKeys: STRIP_CAUTIONS,
        station: null,
      },
      rinse("Flood rinse, three times, look", {
        detail:
          "Fast: weak acid is the one that bites. Any grey or gas means zinc is open there: take it out of the lot.",
        cautionKeys: ["acid-cyanide"],
      }),
      polishBack({
        detail: "Soft wheel, only to even the copper. A grey spot is zinc, and ends the rework of that part.",
        cautionKeys: ["nickel"],
      }),
      strike({
        detail:
          "Short mild clean and a weak dip first, then 3 to 5 µm of copper (guidebook's strike-plate), live entry.",
        minutes: 12,
        cautionKeys: ["live-entry"],
      }),
      photographAndTape({ detail: "Tape, then an hour on white paper: a new stain is a pore that the strip filled." }),
    ],
    whenNot:
      "Not castings with a strike under a few micrometres: the strip reaches zinc before it shows pink. Often a new casting costs less.",
    materials: ["strong sulfuric strip", "soft wheel", "strike-plate bath"],
    sourceKeys: ["astm-b252", "guidebook-copper", "strip-columns", "from-memory"],
  },
  {
    slug: "strip-gold-keep-nickel",
    causeSlugs: ["rinse-dirty", "dried-between-tanks", "bare-hand-touch"],
    title: "After the final plate, mark under gold: strip the gold, keep the nickel",
    steps: [
      beforeStripping({
        detail:
          "Tape at the mark: what holds may stay below. Copper or brass open anywhere (holes, contact points) and this strip is not for it.",
      }),
      {
        title: "Gold off nickel, cyanide with peroxide",
        detail:
          "By those trained for cyanide. Sodium cyanide 120 g/L with hydrogen peroxide 25 mL/L (stress-coupon procedure): made small and fresh, it foams and heats. Out when the nickel is white all over. Solution to gold recovery.",
        minutes: 8,
        perPart: false,
        cautionKeys: ["cyanide", "acid-cyanide", "peroxide-dip", "sheet", "waste"],
        station: null,
      },
      rinse("Rinse three times, apart from acid", {
        detail: "The last two in clean water used for nothing else: cyanide goes no further than here.",
        cautionKeys: ["acid-cyanide", "cyanide"],
      }),
      polishBack({
        detail:
          "Here the nickel, not the strike: only where a ghost of the mark shows, wet and fine. Through the nickel means the whole line.",
        minutes: 4,
        cautionKeys: ["nickel"],
      }),
      activate("Wake the nickel, then gold", {
        detail:
          "Cathodic clean without an anodic end, 10 to 20 % sulfuric dip, two rinses, the acid gold strike wet. Old nickel is passive in minutes.",
        minutes: 6,
      }),
    ],
    whenNot:
      "Not when nickel or copper lifts with the tape: then all of it comes off. Not over silver, copper or brass, which this strip eats.",
    materials: ["gold strip", "gold recovery drum", "fine wet paper"],
    sourceKeys: ["strip-coupons", "osha-1000", "common-practice", "from-memory"],
  },
];
