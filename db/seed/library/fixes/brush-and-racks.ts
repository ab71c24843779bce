/** Brush work, and what hangs or masks the part: tools rather than tanks. Long because it is content. */
import type { LibraryFix } from "@/lib/library/library-entry";
import {
  activate,
  brushStep,
  clean,
  mend,
  photographAndTape,
  polishBack,
  rinse,
  strike,
} from "@/db/seed/library/steps";

export const fixesOfTools: LibraryFix[] = [
  {
    slug: "brush-reactivate",
    causeSlugs: ["brush-activation-off"],
    title: "Brush: polish off, activate again by the sheet's order and polarity",
    steps: [
      polishBack({ detail: "Wet 1000 grit over the masked area and 5 mm past it; wash the grit out of the tray." }),
      brushStep("clean", "Electroclean by brush, read the water break", {
        detail:
          "Lead set forward or reverse as the sheet says, flooded, moving, 20 to 40 s. Water must sheet over the whole area, mask edge too.",
        cautionKeys: ["hot-alkali"],
      }),
      brushStep("activate", "Etch, then desmut, each with its own anode", {
        detail:
          "Etching activator reverse until it is even and matt; rinse; desmutting activator until a white swab stays white. An unmarked anode is not used.",
        minutes: 6,
        cautionKeys: ["acid-splash", "embrittlement"],
      }),
      brushStep("strike", "Strike without letting it dry", {
        detail:
          "Rinse, solution on first, then current: 2 V, up to 4 V once it covers (common practice). Stainless and nickel get the brush nickel preplate before.",
        minutes: 6,
        cautionKeys: ["nickel", "waste"],
      }),
      photographAndTape({ detail: "Tape the middle and the mask edge, where the brush slowed." }),
    ],
    whenNot:
      "Not by a second pass of strike over the haze: it only hides it. Not aluminium, whose brush sequence is another.",
    materials: ["brush electrocleaner", "etching and desmutting activators", "marked anodes", "white swabs"],
    sourceKeys: ["guidebook-brush", "common-practice", "from-memory"],
  },
  {
    slug: "brush-cover-and-flow",
    causeSlugs: ["anode-too-close", "brush-solution-spent"],
    title: "Brush: new cover, soaked through, fed and moving",
    steps: [
      mend("strike", "New cover, soaked before use", {
        detail:
          "Cotton batting and sleeve of even thickness, 10 min in the solution. Graphite showing through, grey cotton or a hard spot: change it.",
        minutes: 12,
        cautionKeys: ["brush-power", "sheet"],
      }),
      mend("strike", "Feed, do not dip, on anything longer than a hand", {
        detail:
          "Pump or drip to the anode until it runs off the low edge; warm it if the sheet asks. Catch tray filtered, back to the bottle of this job only.",
        minutes: 15,
        cautionKeys: ["brush-power", "sheet", "waste"],
      }),
      mend("strike", "Ampere-hours written, bottle retired", {
        detail:
          "Each litre has so much copper to give: count A·h against the sheet's figure, and discard before the colour tells.",
        minutes: 5,
        cautionKeys: ["waste"],
      }),
      mend("strike", "Speed and contact on a scrap plate", {
        detail:
          "Anode over about a third of the area, steady strokes as fast as the sheet says, no stop at the turn. No streak at full volts passes.",
        minutes: 10,
        cautionKeys: ["brush-power", "sheet"],
      }),
    ],
    whenNot: "Not with a cover that has been in another solution: one cover, one solution, thrown away together.",
    materials: ["anode wrap: cotton batting and sleeves", "drip feed or pump", "A·h meter", "scrap plate"],
    sourceKeys: ["guidebook-brush", "common-practice", "from-memory"],
  },
  {
    slug: "brush-preplate-first",
    causeSlugs: ["acid-copper-direct"],
    title: "Brush copper wipes off steel or zinc: nickel or alkaline copper first",
    steps: [
      polishBack({ detail: "Pumice and water until the swab shows no red, mask edge included.", minutes: 4 }),
      brushStep("activate", "Clean and activate by brush", {
        detail:
          "Steel: electroclean, etch, desmut. Zinc: electroclean only, seconds, no acid. Rinse to neutral run-off.",
        cautionKeys: ["acid-splash", "hot-alkali", "embrittlement"],
      }),
      brushStep("strike", "Preplate: brush nickel on steel, alkaline copper on zinc", {
        detail:
          "Until no base metal shows (about a micrometre, from memory). Both hold copper back from trading places; an acid copper never goes on bare.",
        minutes: 6,
        cautionKeys: ["nickel", "waste"],
      }),
      brushStep("strike", "Build copper over it, wet on wet", {
        detail: "Rinse, copper solution on with current from the first touch. Thumb test at the edge after a minute.",
      }),
      photographAndTape({ detail: "Thumb, then tape, at the mask edge: a bare line there lets it start again." }),
    ],
    whenNot: "Not hardened steel without an engineer: the etch and the preplate both put hydrogen in.",
    materials: ["brush nickel preplate", "alkaline brush copper", "pumice", "marked anodes"],
    sourceKeys: ["guidebook-brush", "crc-potentials", "common-practice", "from-memory"],
  },
  {
    slug: "shield-and-rob",
    causeSlugs: ["points-unshielded"],
    title: "Shield or rob the points",
    steps: [
      mend("strike", "Mark where it burns on one rack", {
        detail:
          "Photograph which points, which row, which side. Outer rows and lower corners first; if all points burn alike the current is high, not the shape.",
        minutes: 8,
      }),
      mend(null, "Hang a robber or a shield", {
        detail:
          "A bare wire 1 to 2 cm off the point takes the surplus (strip its copper each day); a plastic baffle bends it away and costs no copper.",
        minutes: 30,
        cautionKeys: ["power"],
      }),
      mend("strike", "Turn and space the rack", {
        detail:
          "Points inwards, neighbours shielding each other, a hand's width to the anode's edge; cut anodes shorter than the work.",
        minutes: 15,
        cautionKeys: ["power", "cyanide", "acid-cyanide"],
      }),
      strike({
        detail:
          "Same amps, plus the robber's share of the area. Nail over the points: no powder, and copper still in the recess.",
      }),
    ],
    whenNot: "Not where the robber starves a recess beside it: an inner anode is the better tool there.",
    materials: ["robber wire", "plastic baffle", "spare rack"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "fit-inner-anode",
    causeSlugs: ["recess-shielded"],
    title: "Fit an auxiliary anode into the recess",
    steps: [
      mend(null, "Depth against width", {
        detail:
          "Deeper than it is wide rarely covers by throw alone (from memory). Ask whether the drawing wants copper in there at all.",
        minutes: 8,
      }),
      mend(null, "Build it", {
        detail:
          "Copper rod or platinised wire a third of the bore, insulating tip and spacers, own lead to the anode bar. It must not touch the work, ever.",
        minutes: 45,
        cautionKeys: ["power"],
      }),
      mend("strike", "First part with the meter on its lead", {
        detail:
          "Its amps from the bore's dm². Solution has to move through: gas out at the top, a nozzle for blind bores.",
        minutes: 15,
        cautionKeys: ["power", "cyanide", "acid-cyanide"],
      }),
      photographAndTape({ detail: "Lamp or borescope down the bore, photograph the deepest place, tape on a stick." }),
    ],
    whenNot: "Not a cure for a bore that was never wetted: look for trapped gas before you build anything.",
    materials: ["copper rod or platinised wire", "spacers", "lamp"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "vent-the-cup",
    causeSlugs: ["gas-or-air-trapped"],
    title: "Vent the cup: rack orientation and rocking",
    steps: [
      mend(null, "Find the high pocket", {
        detail:
          "Hang the part in a clear bucket of water on its rack and look from the side: where air stays now, it stays in every tank.",
        minutes: 8,
      }),
      mend(null, "Re-angle, or vent with a wick", {
        detail:
          "Mouth up and 15 degrees over. What cannot turn gets a thin plastic tube to the top of the pocket, or two hang opposite ways on a swivel.",
        minutes: 25,
      }),
      mend("clean", "Rock it in at each tank", {
        detail:
          "Down, half out, down: three times at cleaner, acid and strike. Drain it the same way, or it carries acid to the cyanide.",
        minutes: 5,
        cautionKeys: ["hot-alkali", "acid-splash", "acid-cyanide"],
      }),
      strike({ detail: "Live after the last rock, not before it: copper laid while it is lifted out has no grip." }),
    ],
    whenNot: "Not mouth up where it then carries a cupful out of each tank: those need a drain as well as a vent.",
    materials: ["clear bucket", "vent tube", "swivel rack"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "drain-holes-agreed",
    causeSlugs: ["seam-holds-solution"],
    title: "Hollow or hemmed part: drain and vent holes, agreed with the customer",
    steps: [
      mend("inspect", "Show what comes out", {
        detail:
          "One part, warmed on white paper: photograph the run and the pH paper. That picture is the letter to the customer.",
        minutes: 10,
      }),
      mend(null, "Two holes, written leave", {
        detail:
          "One low to drain, one high to let air in; 3 to 5 mm (from memory), where the drawing hides them. A hole may be plugged after the bake-out.",
        minutes: 20,
      }),
      rinse("Flush through the holes", {
        detail: "Nozzle into the low hole until the high one runs clear and neutral, at every rinse from now on.",
        minutes: 6,
        cautionKeys: ["acid-cyanide"],
      }),
      {
        title: "Dry through, wait, look",
        detail:
          "Warm air through the hole, an hour seam down. Dry paper: on to the line. A second stain means the seam itself holds it.",
        minutes: 6,
        perPart: false,
        cautionKeys: ["compressed-air", "hot-part"],
        station: "finish",
      },
    ],
    whenNot: "Not pressure, food or load-bearing parts without their engineer, and never a hole on your own authority.",
    materials: ["drill", "flush nozzle", "white paper", "pH paper"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "reseat-masks",
    causeSlugs: ["mask-holds-solution"],
    title: "Mask or plug that leaks: off, flush, dry, seat it again",
    steps: [
      rinse("Mask off over the rinse, flush under it", {
        detail:
          "It held whichever tank came last: acid or cyanide by pH paper first, then into the rinse of that line and no other.",
        minutes: 4,
        cautionKeys: ["acid-cyanide", "acid-splash"],
      }),
      polishBack({ detail: "Stain and thin copper along the mask line, wet, feathered.", minutes: 4 }),
      {
        title: "Dry the seat, mask again",
        detail:
          "Warm and dry metal only. Tape rolled from the middle out, edge burnished; lacquer in two coats, dried between; plugs a size up, greaseless.",
        minutes: 6,
        perPart: true,
        cautionKeys: ["solvent"],
        station: null,
      },
      clean("Short clean, mask watched", {
        detail: "Bubbles at an edge mean it breathes, and will bleed: do it again now.",
        minutes: 4,
      }),
      activate("Line card time, two sprayed rinses", { detail: "Spray along each mask edge in both." }),
      strike({ detail: "Then mask off at once, flush, and an hour on white paper before the part goes on." }),
    ],
    whenNot: "Not with rubber or wax at cleaner heat that its maker does not allow: it opens in the first tank.",
    materials: ["plating tape", "lacquer", "silicone-free plugs", "pH paper"],
    sourceKeys: ["common-practice", "from-memory"],
  },
];
