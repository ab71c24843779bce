/** Underactivation: the base metal was still passive when the copper came. Long because it is content: one class, whole. */
import type { ShelfPart } from "@/lib/library/library-entry";
import {
  activate,
  clean,
  mend,
  photographAndTape,
  polishBack,
  rinse,
  rinseToWaterBreak,
  strike,
} from "@/db/seed/library/steps";

export const underactivation: ShelfPart = {
  class: {
    slug: "underactivation",
    title: "Underactivation",
    short: "Patchy, hazy copper that thins out and lifts on tape. The base metal never woke up.",
    atStrike:
      "Copper comes late and thin. Patches fade into the base metal without an edge, hazy or milky, often worst where the part is thick, was heat treated, or where a clip shaded it. Tape lifts the haze and the base metal under it is clean and still has its old colour.",
    inFinalPlate:
      "Nickel levels over it and looks right, then blisters in the bake, in ISO 2819's thermal shock or in the customer's press fit. Gold shows it as a cloud. The deposit leaves with the strike on its back and bright base metal below.",
    tells: [
      {
        versus: "dewetting",
        tell: "The edge fades, and the water film held before the strike. Dewetting has islands with a sharp edge, and the film broke there.",
      },
      {
        versus: "overactivation",
        tell: "Wipe with a white cloth: it stays clean and the haze is pale. Overactivation leaves black on the cloth.",
      },
      {
        versus: "peeling",
        tell: "Here the copper is hazy and thin before you test it. In peeling it looks whole and bright until the tape lifts it.",
      },
      {
        versus: "immersion-deposit",
        tell: "It needs tape to lift and it came after the power. An immersion deposit wipes off with a thumb and was there before.",
      },
      {
        versus: "no-deposit",
        tell: "The bare place fades into haze, and the haze lifts. No deposit has sound copper right up to it.",
      },
      {
        versus: "sound",
        tell: "It fades somewhere, and tape finds it. Tilt it under one lamp: a thin strike that is sound is thin alike all over.",
      },
    ],
    checks: [
      "Time the first copper. Longer than about 30 s on a good strike (common practice) points at the surface; on a coupon of known clean brass as well, it points at the strike.",
      "Abrade one patch wet, dip it in the same activator and strike. If copper now holds there, the surface was passive.",
      "Dip half of a spare part in fresh activator, half in the old. A line across the part names the bottle.",
    ],
    prevention: [
      "Write the make-up date on the activator and change it by parts or dm² run, not by colour.",
      "Post one time per alloy at the tank, and use a timer, not a count.",
      "Stainless and nickel go from the activating strike to the copper strike without drying and without a wait.",
      "Ask for the alloy on the job card. 'Steel' is not an alloy.",
    ],
    stripNote:
      "At the strike a wet wipe of abrasive takes it off, the grip was never there. Under final plate it comes off in sheets where it was worst and not at all elsewhere, so the whole part must be stripped and repolished.",
    otherLikelihood: 0.05,
    sourceKeys: ["astm-b322", "astm-b254", "iso-2819", "common-practice", "from-memory"],
    synonyms: [
      "won't stick",
      "doesn't stick",
      "lazy",
      "slow to start",
      "slow to cover",
      "fades out",
      "faded",
      "see-through",
      "uneven",
      "uneven coverage",
      "passivated",
      "won't activate",
      "dull",
      "whitish",
      "grey haze",
      "foggy copper",
      "half plated",
      "streaky haze",
      "wishy washy",
      "won't take",
      "didn't take",
      "not taking",
      "sleepy",
      "sleepy brass",
      "asleep",
      "haze",
      "hazy",
      "cloudy",
      "cloudy strike",
      "milky",
      "frosty",
      "patchy",
      "thin copper",
      "blotchy",
      "passive",
      "slow to copper",
      "pale pink",
      "under activated",
      "under pickled",
      "not enough etch",
    ],
    position: 1,
  },
  causes: [
    {
      slug: "activator-spent",
      classSlugs: ["underactivation"],
      title: "Activator past its day",
      station: "activate",
      why: "Each part spends acid and leaves metal behind. The acid weakens, and dissolved metal slows the rest, long before it looks any different.",
      proof:
        "Titrate it, or run one part through a fresh beaker of the same make-up. If the beaker part strikes whole and the tank part does not, change it.",
      likelihood: 0.29,
      baseMetals: [
        "steel",
        "stainless",
        "iron",
        "brass",
        "bronze",
        "copper",
        "nickel-silver",
        "nickel",
        "zinc",
        "aluminium",
      ],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
      synonyms: [
        "tired acid",
        "old activator",
        "weak acid",
        "dead pickle",
        "acid too old",
        "acid never changed",
        "worn out dip",
        "activator exhausted",
        "flat acid",
      ],
    },
    {
      slug: "activator-dwell-short",
      classSlugs: ["underactivation"],
      title: "Too short in the activator",
      station: "activate",
      why: "The oxide needs its time: common practice is 15 to 60 s in sulfuric and 15 to 120 s in hydrochloric, at room temperature. A cold winter tank needs the long end, and so does a nested rack.",
      proof:
        "Double the time on one part, nothing else changed. Sound copper proves it; no change clears the dwell and points at the acid itself.",
      likelihood: 0.16,
      baseMetals: ["steel", "iron", "brass", "bronze", "copper", "nickel-silver", "nickel", "stainless"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "dwell too short",
        "pulled too soon",
        "rushed the dip",
        "not long enough in the acid",
        "quick dip",
        "short pickle",
      ],
    },
    {
      slug: "activator-wrong",
      classSlugs: ["underactivation"],
      title: "Wrong activator for the alloy",
      station: "activate",
      why: "Sulfuric does nothing useful to stainless or old nickel; plain acid leaves the silicon on cast aluminium; acid alone never readies aluminium at all. Each needs its own route: Woods nickel strike, fluoride desmut, zincate.",
      proof:
        "Read the alloy off the job card, or weigh the part in air and water, and hold it to the line card. One part through the right route that comes out sound proves it.",
      likelihood: 0.13,
      baseMetals: ["stainless", "nickel", "aluminium", "nickel-silver", "bronze", "iron", "other"],
      sourceKeys: ["astm-b254", "astm-b253", "guidebook-aluminium", "woods-columns", "from-memory"],
      synonyms: [
        "wrong acid",
        "wrong pickle",
        "wrong dip",
        "sulfuric on stainless",
        "no Woods strike",
        "wrong activator",
        "plain acid on aluminium bronze",
        "titanium will not take",
      ],
    },
    {
      slug: "repassivated-in-transfer",
      classSlugs: ["underactivation"],
      title: "Went passive again on the way to the strike",
      station: "rinse",
      why: "Stainless, nickel and chromium-bearing alloys grow their film back in seconds once they leave acid, faster in a warm aerated rinse or as they dry. The acid worked; the walk undid it.",
      proof:
        "Run one part acid, one quick rinse, strike, in under 15 s. If that one holds, the wait is the cause. Time the usual walk with a watch.",
      likelihood: 0.11,
      baseMetals: ["stainless", "nickel", "aluminium", "nickel-silver"],
      sourceKeys: ["astm-b254", "common-practice", "from-memory"],
      synonyms: [
        "dried in the walk",
        "slow transfer",
        "waited too long before strike",
        "repassivated",
        "long rinse",
        "sat on the bench after acid",
      ],
    },
    {
      slug: "scale-left",
      classSlugs: ["underactivation"],
      title: "Scale or heavy oxide left on",
      station: "clean",
      why: "Heat-treat scale, weld or solder tint and old tarnish are thicker than an activator is meant for. It thins them and leaves the rest.",
      proof:
        "Look at the bare part under a loupe: grey or blue-black that does not wipe. Blast or abrade one spot, then run it; copper only on that spot proves scale.",
      likelihood: 0.09,
      baseMetals: ["steel", "stainless", "iron", "copper", "brass", "bronze"],
      sourceKeys: ["astm-b183", "astm-b254", "common-practice", "from-memory"],
      synonyms: [
        "heat treat scale",
        "mill scale",
        "scale on the weldment",
        "weld tint",
        "heat tint",
        "fire scale",
        "solder oxide",
        "blueing",
      ],
    },
    {
      slug: "strike-voltage-low",
      classSlugs: ["underactivation", "no-deposit"],
      title: "Strike voltage or current too low",
      station: "strike",
      why: "Below its window the strike deposits slowly or not at all in low-current areas, and the cyanide keeps cleaning where copper ought to be. Bad contact, a tired rectifier, polarised anodes or too many parts on one bar all do it.",
      proof:
        "Meter the volts at the rack, not at the rectifier, and the total current against the area. Halve the load: copper at once proves it.",
      likelihood: 0.08,
      baseMetals: [
        "steel",
        "stainless",
        "iron",
        "brass",
        "bronze",
        "copper",
        "nickel-silver",
        "nickel",
        "zinc",
        "aluminium",
      ],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
      synonyms: [
        "low volts",
        "no amps",
        "weak current",
        "rectifier low",
        "voltage too low",
        "anodes polarized",
        "overloaded rack",
      ],
    },
    {
      slug: "silver-tarnish-left",
      classSlugs: ["underactivation"],
      title: "Tarnish or fire scale left on silver or gold alloy",
      station: "clean",
      why: "Silver sulfide, and the copper oxide that soldering brings up on sterling and karat gold, are no oil and no rust: neither cleaner nor a quick dip takes them. Hydrochloric makes it worse, with a film of silver chloride.",
      proof:
        "A cathodic clean of a minute lightens sulfide to white. What stays pink-grey, in patches where the torch was, is fire scale. Abrade half a spot and strike it: copper only there proves it.",
      likelihood: 0.04,
      baseMetals: ["silver", "gold"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "silver tarnish",
        "black silver",
        "firestain",
        "firescale on sterling",
        "torch marks",
        "silver chloride",
        "sulfide",
        "toned silver",
      ],
    },
    {
      slug: "brush-activation-off",
      classSlugs: ["underactivation"],
      title: "Brush activation in the wrong order, polarity or cover",
      station: "activate",
      why: "Etch and desmut ask for opposite leads, and an anode cover that has been in the strike carries cyanide and copper back into the acid. The face looks even and is passive or filmed.",
      proof:
        "Do a coin-sized spot by the sheet: fresh marked covers, polarity read off the box, timed. Copper that holds on that spot alone proves it.",
      likelihood: 0.05,
      baseMetals: ["steel", "stainless", "iron", "nickel", "brass", "bronze", "copper"],
      sourceKeys: ["guidebook-brush", "common-practice", "from-memory"],
      synonyms: [
        "leads swapped",
        "forward and reverse mixed up",
        "polarity reversed",
        "stylus activation",
        "selective plating",
        "shared cover",
        "brush prep wrong",
        "pen plating",
      ],
    },
  ],
  fixes: [
    {
      slug: "polish-and-fresh-activator",
      causeSlugs: ["activator-spent"],
      title: "Polish back, fresh activator, re-strike",
      steps: [
        polishBack({
          detail:
            "Wet, 1000 to 1200 grit, the whole patch and past it until bright base metal shows all round. Edges lightly.",
        }),
        clean("Electroclean", { detail: "1 to 2 min, steel anodic. Polishing leaves grit and hand oil.", minutes: 5 }),
        rinseToWaterBreak(),
        activate("Fresh activator, timed", {
          detail:
            "New make-up from the line card: sulfuric 5 to 10 % by volume for brass, copper and steel, 15 to 60 s at room temperature (common practice). Rinse twice.",
          minutes: 4,
        }),
        strike({ detail: "At the line's window, at once. Expect copper in about 30 s." }),
        photographAndTape(),
      ],
      whenNot: "Not stainless, nickel or aluminium: fresh sulfuric will not wake them. Use their route.",
      materials: ["1000 to 1200 grit wet paper", "fresh activator", "timer", "tape"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
    },
    {
      slug: "change-activator",
      causeSlugs: ["activator-spent"],
      title: "Change the activator and date it",
      steps: [
        mend("activate", "Empty to treatment", {
          detail:
            "Pump the spent acid to the acid line, never where cyanide drains. Rinse the tank, look for sludge and parts.",
          minutes: 20,
          cautionKeys: ["acid-cyanide", "acid-splash", "waste"],
        }),
        mend("activate", "Make up new", {
          detail: "Water first, acid into it slowly, stir, let it cool to room temperature. Write the date and who.",
          minutes: 20,
          cautionKeys: ["acid-cyanide", "acid-splash", "sheet"],
        }),
        mend("activate", "Prove it", {
          detail:
            "One coupon of the commonest alloy through the line. First copper inside the window goes in the log as day 0.",
          minutes: 8,
          cautionKeys: ["acid-cyanide", "acid-splash", "power"],
        }),
      ],
      whenNot: "If a fresh beaker strikes no better, the acid is not the cause: keep it and look on.",
      materials: ["acid", "test coupon", "log label"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "longer-dwell",
      causeSlugs: ["activator-dwell-short"],
      title: "Polish the haze off and give it longer in the acid",
      steps: [
        polishBack({ detail: "Only the hazy patches, wet, until the copper is gone.", minutes: 4 }),
        rinseToWaterBreak({ detail: "Rinse the grit off and read the film. If it breaks, clean first." }),
        activate("Activate by the timer", {
          detail:
            "Line card time for the alloy, from the moment the last part is under. Move the rack. Steel in hydrochloric: even fine gas is the sign. Brass: a change to even, matt pink-yellow, no longer.",
        }),
        strike({ detail: "At once. Compare the time to first copper with a sound run of the same alloy." }),
        photographAndTape(),
      ],
      whenNot: "Not zinc die cast: it stops at the first gas. Not if twice the time made no change.",
      materials: ["timer at the tank", "fine wet paper"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "right-route-stainless-nickel",
      causeSlugs: ["activator-wrong", "repassivated-in-transfer", "passive-base-no-nickel-strike"],
      title: "Stainless or nickel: Woods strike, then copper, wet all the way",
      steps: [
        polishBack({
          detail:
            "Wet, fine, all of the copper, also where it held: the same film lies under it. It breaks the old film too. Nickel dust: keep it wet.",
          cautionKeys: ["nickel"],
        }),
        clean("Electroclean", {
          detail: "1 to 2 min. On nickel finish cathodic: anodic makes it passive.",
          minutes: 5,
        }),
        rinseToWaterBreak(),
        activate("Hydrochloric dip, 30 to 60 s", {
          detail:
            "20 to 50 % by volume. Go on to the nickel strike without drying; a short rinse only if the card says so.",
          minutes: 2,
        }),
        {
          title: "Woods nickel strike, 1 to 3 minutes",
          detail:
            "Nickel chloride 225 to 240 g/L with hydrochloric acid 110 to 125 mL/L, 21 to 32 °C (trade columns). Current: use what this tank proves, the sources differ widely. Rinse twice and well: this bath is acid.",
          minutes: 4,
          perPart: false,
          cautionKeys: ["nickel", "acid-cyanide", "acid-splash", "power", "embrittlement"],
          station: "strike",
        },
        strike({ detail: "Straight from the rinse, under 15 s, still wet. Tape test each part of this rack." }),
      ],
      whenNot:
        "Not aluminium or zinc die cast: the acid eats them. Not 400-series springs or hardened stainless without an engineer.",
      materials: ["hydrochloric acid", "Woods nickel strike", "nickel anodes"],
      sourceKeys: ["astm-b254", "woods-columns", "common-practice", "from-memory"],
    },
    {
      slug: "right-route-aluminium",
      causeSlugs: ["activator-wrong"],
      title: "Aluminium: desmut, zincate twice, then strike",
      steps: [
        {
          title: "Take the copper and old zincate off",
          detail:
            "Three rinses first, so that no cyanide of the strike rides into the acid. Then nitric acid 50 % by volume until the face is clean and even, usually under a minute. It takes copper and zinc and leaves aluminium.",
          minutes: 3,
          perPart: false,
          cautionKeys: ["nitric", "acid-cyanide", "acid-splash", "waste"],
          station: "activate",
        },
        clean("Etch and rinse", {
          detail:
            "Inhibited or mild etch, 20 to 60 s by the alloy. Thin walls and polished faces: the least that works.",
          minutes: 4,
        }),
        {
          title: "Desmut for the alloy",
          detail:
            "Wrought: nitric. Silicon castings such as A380: nitric with sulfuric and ammonium bifluoride 120 to 240 g/L, the high end at about 12 % silicon (guidebook), for seconds.",
          minutes: 3,
          perPart: false,
          cautionKeys: ["hydrofluoric", "nitric", "acid-cyanide", "acid-splash"],
          station: "activate",
        },
        {
          title: "Zincate, strip in nitric, zincate again",
          detail:
            "30 to 60 s, strip in 50 % nitric, then 15 to 30 s for the second coat: thin, even, blue-grey. Rinse well after each.",
          minutes: 6,
          perPart: false,
          cautionKeys: ["nitric", "hot-alkali", "acid-cyanide"],
          station: "activate",
        },
        strike({
          detail:
            "Live entry at low voltage, at once: low free cyanide (1.5 to 3 g/L in the guidebook's bath for zincate), or the shop's neutral nickel strike.",
          cautionKeys: ["live-entry"],
        }),
        photographAndTape(),
      ],
      whenNot: "Not in a shop without fluoride training and exhaust: send silicon castings out.",
      materials: ["nitric acid", "bifluoride desmut", "zincate", "low-cyanide copper strike"],
      sourceKeys: ["astm-b253", "guidebook-aluminium", "common-practice", "from-memory"],
    },
    {
      slug: "cut-the-walk",
      causeSlugs: ["repassivated-in-transfer"],
      title: "Cut the time between acid and strike",
      steps: [
        mend("rinse", "Time the walk", {
          detail: "From out of the acid to current on, five racks. Write the longest, not the mean.",
          minutes: 15,
        }),
        mend("rinse", "Move the rinse, not the person", {
          detail:
            "One short cold spray or dip rinse between acid and a water rinse before cyanide. Cold and still holds better than warm and aired.",
          minutes: 30,
          cautionKeys: ["acid-cyanide"],
        }),
        mend("strike", "Current ready before the rack leaves the acid", {
          detail: "Rectifier set, bar free, one rack at a time. Nothing waits in a rinse over 15 s.",
          minutes: 5,
          cautionKeys: ["power"],
        }),
      ],
      whenNot: "Never shorten it by dropping the second rinse between acid and cyanide.",
      materials: ["stopwatch", "spray rinse"],
      sourceKeys: ["astm-b254", "common-practice", "from-memory"],
    },
    {
      slug: "descale-and-restart",
      causeSlugs: ["scale-left"],
      title: "Descale, then the whole line again",
      steps: [
        {
          title: "Take scale off by blast or abrasive",
          detail:
            "Fine glass bead or wet abrasive until the face is one even colour under a loupe. Mask threads and fits; agree the change of surface with the customer.",
          minutes: 8,
          perPart: true,
          cautionKeys: ["polishing-dust", "lead-dust", "beryllium"],
          station: null,
        },
        clean("Soak and electroclean", {
          detail: "Full times. Alternating or anodic for steel, to lift smut along with grit.",
          minutes: 8,
        }),
        rinseToWaterBreak(),
        activate("Pickle, then activate", {
          detail:
            "Inhibited hydrochloric for steel, no longer than the scale needs, brushing off smut; 5 to 10 % sulfuric for copper alloys.",
          minutes: 5,
        }),
        strike({ detail: "At once, then look first at welds and at edges that were hot." }),
        photographAndTape(),
      ],
      whenNot: "Not acid alone on hardened or spring steel: mechanical descaling, and an engineer.",
      materials: ["glass bead or wet paper", "inhibited acid"],
      sourceKeys: ["astm-b183", "astm-b242", "common-practice", "from-memory"],
    },
    {
      slug: "bring-up-strike-current",
      causeSlugs: ["strike-voltage-low"],
      title: "Bring the strike back into its window",
      steps: [
        mend("strike", "Measure at the rack", {
          detail:
            "Volts from rack hook to anode, total amps, and amps per dm² of what hangs. Guidebook range for a cyanide strike: 0.5 to 4 A/dm².",
          minutes: 10,
          cautionKeys: ["power"],
        }),
        mend("strike", "Clean contacts and anodes", {
          detail:
            "Current off. Scour bar, hooks and rack tips. Brush white or green film off the anodes; if it returns, analyse free cyanide.",
          minutes: 20,
          cautionKeys: ["power", "cyanide", "acid-cyanide"],
        }),
        mend("strike", "Load to the rectifier, not to the bar", {
          detail: "Fewer parts per rack until first copper comes inside the window. Write the load on the card.",
          minutes: 5,
        }),
        polishBack({ detail: "Parts that carry haze: wet, fine, to bare metal. Bare ones need none.", minutes: 4 }),
        activate("Activate again", { detail: "Line card time: the part stood while the tank was mended." }),
        strike({
          detail: "Raise the voltage in small steps and stop before edges darken.",
        }),
      ],
      whenNot: "Not by voltage alone when the contact is bad: the good parts burn and the bad stay bare.",
      materials: ["multimeter", "scouring pad", "anode brush"],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
    },
    {
      slug: "rinse-twice-reactivate",
      causeSlugs: ["activator-dwell-short", "activator-spent"],
      title: "Copper alloy caught wet: dip again and re-strike",
      steps: [
        rinse("Off the strike, rinse three times", {
          detail:
            "Still wet and seen within a minute. Three rinses, the last one not shared with the cyanide line, before any acid.",
          minutes: 3,
          cautionKeys: ["acid-cyanide"],
        }),
        {
          title: "Rub the haze off with wet pumice",
          detail: "Thin haze leaves under a wet pumice rub. If it does not leave, go to the polish-back card.",
          minutes: 3,
          perPart: true,
          cautionKeys: ["polishing-dust"],
          station: null,
        },
        activate("Fresh activator, 20 to 30 s", {
          detail: "Fresh beaker or tank. Two rinses, no stop on the way.",
          cautionKeys: [],
        }),
        strike({ detail: "Current on at once. Copper whole in 30 s or it goes to the polish-back card." }),
        photographAndTape(),
      ],
      whenNot:
        "Not steel, stainless or zinc, and not a part that has dried: the copper left on hides what is under it.",
      materials: ["pumice", "fresh activator"],
      sourceKeys: ["astm-b281", "common-practice", "from-memory"],
    },
  ],
};
