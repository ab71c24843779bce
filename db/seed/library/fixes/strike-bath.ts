/** What is mended in a bath or at a rectifier, so that the next rack does not need a card. Long because it is content. */
import type { LibraryFix } from "@/lib/library/library-entry";
import { clean, mend, photographAndTape, polishBack, strike } from "@/db/seed/library/steps";

const BATH = ["cyanide", "acid-cyanide"];

export const fixesOfBaths: LibraryFix[] = [
  {
    slug: "freeze-out-carbonate",
    causeSlugs: ["carbonate-high"],
    title: "Sodium strike: freeze the carbonate out",
    steps: [
      mend("strike", "Analyse, and read the label: sodium or potassium", {
        detail:
          "Carbonate by titration. A new strike holds 15 g/L (guidebook); most shops act at 60 to 90 g/L (from memory). Potassium carbonate does not freeze out.",
        minutes: 25,
        cautionKeys: [...BATH, "sheet"],
      }),
      mend("strike", "Chill to 0 to 5 °C and hold overnight", {
        detail:
          "In a covered, labelled side tank with ventilation, alkaline by test first. Washing soda grows on the walls and floor.",
        minutes: 45,
        cautionKeys: [...BATH, "waste"],
      }),
      mend("strike", "Pump the clear bath off the crystals", {
        detail:
          "Through the filter, back to the working tank, before it warms. Crystals hold cyanide: drum them for treatment, never the acid line.",
        minutes: 40,
        cautionKeys: [...BATH, "waste"],
      }),
      mend("strike", "Analyse again, then a Hull cell", {
        detail:
          "Copper, free cyanide, caustic: drag-out in the crystals took some of each. Add, then run the cell before a rack.",
        minutes: 30,
        cautionKeys: [...BATH, "power", "sheet"],
      }),
    ],
    whenNot: "Not on a potassium bath. Not when carbonate is inside its limit: cold upsets a good bath for a day.",
    materials: ["side tank with cooling", "titration kit", "Hull cell", "labelled drum"],
    sourceKeys: ["guidebook-copper", "epa-261", "common-practice", "from-memory"],
  },
  {
    slug: "calcium-treat-carbonate",
    causeSlugs: ["carbonate-high"],
    title: "Potassium strike: take carbonate down with lime or gypsum",
    steps: [
      mend("strike", "Prove the dose on a litre", {
        detail:
          "About 0.5 g calcium hydroxide, or 1.25 g gypsum, for each g of potassium carbonate to go (from the formula weights). Warm, stir an hour, settle, filter, Hull cell.",
        minutes: 40,
        cautionKeys: [...BATH, "sheet"],
      }),
      mend("strike", "Treat in a side tank, in portions", {
        detail:
          "Slurry it in water first. Lime raises caustic, gypsum leaves sulfate: choose by which of the two the analysis can bear.",
        minutes: 60,
        cautionKeys: [...BATH, "hot-alkali", "sheet"],
      }),
      mend("strike", "Settle overnight, decant through the filter", {
        detail: "The sludge carries cyanide and copper (F008): to treatment, wet and labelled.",
        minutes: 45,
        cautionKeys: [...BATH, "waste"],
      }),
      mend("strike", "Analyse and bring back into the window", {
        detail:
          "Copper, free cyanide, hydroxide, Rochelle salt. The first coupon is read at both ends of the current range.",
        minutes: 30,
        cautionKeys: [...BATH, "power", "sheet"],
      }),
    ],
    whenNot:
      "Not instead of finding where it comes from: air agitation, hot idling and anodes with too little area make it again in months.",
    materials: ["calcium hydroxide or gypsum (calcium sulfate)", "side tank", "filter", "titration kit"],
    sourceKeys: ["epa-261", "common-practice", "from-memory"],
  },
  {
    slug: "reduce-chromium",
    causeSlugs: ["chromium-dragged-in"],
    title: "Chromium in the strike: reduce it, filter it, stop it at the rack",
    steps: [
      mend("strike", "Prove it on a litre", {
        detail:
          "Strike a bent coupon as it is, then with about 0.1 g/L sodium hydrosulfite stirred in warm (from memory). Copper coming back in the low-current bend is the proof.",
        minutes: 25,
        cautionKeys: [...BATH, "hydrosulfite", "power"],
      }),
      mend("strike", "Treat the tank by what the litre took", {
        detail:
          "Bath at about 60 °C, alkaline by test, ventilation on. Add dissolved in small lots, stir half an hour; a maker's reducer by its sheet is the quieter way.",
        minutes: 40,
        cautionKeys: [...BATH, "hydrosulfite", "hexavalent-chromium", "sheet"],
      }),
      mend("strike", "Carbon and filter, then the bent coupon again", {
        detail: "A turnover or two through a fresh pack. Dummy at low current until the bend covers.",
        minutes: 60,
        cautionKeys: [...BATH, "power", "waste"],
      }),
      mend(null, "Find the rack that brought it", {
        detail:
          "Split plastisol, hollow hooks, racks that also hang in chromium. Recoat, or give the chromium line its own colour of rack.",
        minutes: 30,
        cautionKeys: ["hexavalent-chromium"],
      }),
    ],
    whenNot: "Not by guess: too much reducer dulls the strike for days. Not in any bath that is not alkaline.",
    materials: ["sodium hydrosulfite or a maker's reducer", "bent coupon", "activated carbon", "filter packs"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "wake-the-anodes",
    causeSlugs: ["strike-voltage-low", "free-cyanide-low"],
    title: "Dead anodes: scrub, hang more, bag, keep free cyanide up",
    steps: [
      mend("strike", "Read each anode with a clamp meter", {
        detail:
          "Amps on each hook under load. One that carries nothing is off contact or filmed; all low with volts high means too little area or cyanide.",
        minutes: 10,
        cautionKeys: ["power"],
      }),
      mend("strike", "Out, rinse, scrub to copper", {
        detail:
          "Current off. Brush green or white film off in water that goes to cyanide treatment; hooks to bright metal.",
        minutes: 25,
        cautionKeys: [...BATH, "power", "waste"],
      }),
      mend("strike", "Area, bags and baskets", {
        detail:
          "Anode to work about 2 to 1 (common practice), bags leached and not blinded, pieces topped up to the waterline.",
        minutes: 25,
        cautionKeys: [...BATH, "power"],
      }),
      mend("strike", "Free cyanide by analysis, then read again", {
        detail: "11 to 15 g/L in the guidebook's strike. Below it they film again inside the week.",
        minutes: 25,
        cautionKeys: [...BATH, "sheet"],
      }),
    ],
    whenNot: "Not by raising the volts: a filmed anode makes oxygen and carbonate, and no copper.",
    materials: ["clamp meter", "anode bags", "copper anodes", "stiff brush"],
    sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
  },
  {
    slug: "clear-cathodic-cleaner",
    causeSlugs: ["cleaner-plated-film"],
    title: "Cleaner that plates: change it, turn the polarity, strip the film",
    steps: [
      mend("clean", "White-cloth test after the cleaner", {
        detail:
          "A scoured steel panel, cathodic, line time. Rinse, wipe: grey or red that was not there came out of the tank. Note which way the polarity switch stood.",
        minutes: 8,
        cautionKeys: ["hot-alkali", "power"],
      }),
      mend("clean", "Dump it, and keep metal out", {
        detail:
          "Drained to its own line. Brass and zinc no longer go anodic in the tank that cleans steel cathodic; fallen parts come off the floor.",
        minutes: 40,
        cautionKeys: ["hot-alkali", "waste"],
      }),
      polishBack({ detail: "Film and copper together, wet, until the cloth is clean: no cleaner takes it off again." }),
      clean("New cleaner, anodic to end", {
        detail:
          "Cathodic for the scrub if the alloy wants it, last 10 to 20 s anodic on steel; copper alloys 3 to 5 s.",
      }),
      strike({ detail: "The alloy's dip and two rinses, then in. Tape the first part." }),
    ],
    whenNot:
      "Not anodic on nickel, nickel silver, tin or solder: keep those cathodic, in a tank that serves nothing else.",
    materials: ["new electrocleaner", "steel panel", "white cloth"],
    sourceKeys: ["astm-b322", "common-practice", "from-memory"],
  },
  {
    slug: "set-current-by-area",
    causeSlugs: ["strike-voltage-high"],
    title: "Set the current by area, and ramp it",
    steps: [
      mend("strike", "Area of a full rack, on the card", {
        detail: "dm² of one part, times parts, plus bare rack. Half a rack is half the amps.",
        minutes: 15,
      }),
      mend("strike", "Amps from area", {
        detail:
          "Inside 0.5 to 4 A/dm² (guidebook): begin at 1 and find with coupons where edges darken; the card gets two thirds of that.",
        minutes: 20,
        cautionKeys: ["power", ...BATH],
      }),
      mend("strike", "Ramp, with a dummy for the short rack", {
        detail:
          "Low on entry, up over 10 s. The last rack of a lot is filled with scrap pieces, so that the few do not get what many would.",
        minutes: 10,
        cautionKeys: ["power"],
      }),
    ],
    whenNot: "Not by trusting the rectifier's own dial: check it against a clamp meter once a month.",
    materials: ["clamp meter", "area card", "dummy pieces"],
    sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
  },
  {
    slug: "steady-the-current",
    causeSlugs: ["current-interrupted"],
    title: "Find what cuts the current, and make a cut mean out",
    steps: [
      mend("strike", "Watch the amps for five racks", {
        detail:
          "Recording clamp meter on the rack lead. A dip when the hoist bumps is the saddle; a dip by the clock is the rectifier.",
        minutes: 20,
        cautionKeys: ["power"],
      }),
      mend("strike", "Saddles and bars that do not bounce", {
        detail:
          "Current off. V-saddles scoured, weight on light racks, cable ends tight. Rectifier and bus work is a licensed electrician's.",
        minutes: 40,
        cautionKeys: ["power"],
      }),
      mend("strike", "The rule on the tank", {
        detail:
          "Current lost for more than a moment, or a rack lifted: out, rinse, activate, strike again. No hanging it back.",
        minutes: 5,
        cautionKeys: ["acid-cyanide"],
      }),
      photographAndTape({
        detail: "First rack after the mend: tape an edge and the middle, look for copper under copper.",
      }),
    ],
    whenNot: "Not a cure for the rack that was cut: its copper comes off first.",
    materials: ["recording clamp meter", "V-saddles"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "zincate-bath-restore",
    causeSlugs: ["zincate-poor"],
    title: "Bring the zincate back: temperature, drag-in, density",
    steps: [
      mend("activate", "Read it before adding", {
        detail:
          "Temperature (18 to 27 °C, from memory), density against a new make-up, zinc and caustic by the maker's titration. Warm and thin gives a coarse, dark film.",
        minutes: 20,
        cautionKeys: ["hot-alkali", "sheet", "acid-cyanide"],
      }),
      mend("activate", "Stop the drag-in of nitric", {
        detail: "A second rinse between desmut and zincate, drained 10 s. Acid eats the caustic that holds the zinc.",
        minutes: 15,
        cautionKeys: ["nitric", "acid-cyanide"],
      }),
      mend("activate", "Add, or make new past its dm² limit", {
        detail:
          "By the sheet. Sludge and copper colour on the walls say new. Spent zincate is caustic with zinc: to treatment.",
        minutes: 40,
        cautionKeys: ["hot-alkali", "sheet", "waste", "acid-cyanide"],
      }),
      mend("activate", "Panel of the commonest alloy", {
        detail: "Second coat thin, even, blue-grey. Strike with live entry, warm as ISO 2819 says, quench, look.",
        minutes: 20,
        cautionKeys: ["live-entry", "hot-part", "acid-cyanide", "power"],
      }),
    ],
    whenNot:
      "Not before the desmut is cleared of blame: a smutty casting turns the best zincate black. Not steel: it has no use for it.",
    materials: ["zincate concentrate", "hydrometer", "aluminium panel"],
    sourceKeys: ["astm-b253", "guidebook-aluminium", "iso-2819", "from-memory"],
  },
  {
    slug: "woods-bath-restore",
    causeSlugs: ["passive-base-no-nickel-strike"],
    title: "Woods bath that no longer holds: bring back acid and anodes, dummy copper out",
    steps: [
      mend("strike", "Acid and nickel by titration", {
        detail:
          "Hydrochloric acid 110 to 125 mL/L as made up, nickel chloride 225 to 240 g/L (trade columns). Acid falls first, by drag-out and anodes.",
        minutes: 20,
        cautionKeys: ["nickel", "acid-splash", "acid-cyanide", "sheet"],
      }),
      mend("strike", "Look at the colour and dummy it", {
        detail:
          "Brown-green is iron, a dark low-current end copper. Corrugated dummy at low current for copper; iron means part new bath.",
        minutes: 45,
        cautionKeys: ["nickel", "power", "acid-splash", "acid-cyanide"],
      }),
      mend("strike", "Anodes of the right kind, out when idle", {
        detail: "Nickel in bags. Left hanging overnight they dissolve, and nickel climbs while acid falls.",
        minutes: 15,
        cautionKeys: ["nickel", "power", "acid-splash", "acid-cyanide"],
      }),
      mend("strike", "Prove it on 304", {
        detail: "A scoured 304 panel through the route, bent double: no flake at the bend.",
        minutes: 15,
        cautionKeys: ["nickel", "power", "acid-cyanide"],
      }),
    ],
    whenNot: "Not when a fresh litre of it holds no better: then the metal was not clean, or it waited on the way.",
    materials: ["hydrochloric acid", "bagged nickel anodes", "dummy panel", "304 panel"],
    sourceKeys: ["astm-b254", "woods-columns", "common-practice", "from-memory"],
  },
];
