/** Dewetting: the film on the part broke, so the strike has bare islands. Long because it is content: one class, whole. */
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

export const dewetting: ShelfPart = {
  class: {
    slug: "dewetting",
    title: "Dewetting",
    short: "Bare islands with clean edges, where the wet film broke over something greasy.",
    atStrike:
      "Round or finger-shaped bare islands in copper that is otherwise bright. The edge is sharp, often with a darker rim, and the copper right beside it holds on tape. Islands sit where grease lives: letters, corners, under a clip, along the waterline. On a wet part the film pulls back from them while you watch.",
    inFinalPlate:
      "Nickel or gold bridges the island with no grip under it: a dull patch or pinhole cluster first, then a blister when the part is heated, burnished or bent. What rusts through in service often follows the outline of the island.",
    tells: [
      {
        versus: "underactivation",
        tell: "An island has an edge you could trace, and copper beside it holds on tape. Underactivation has no edge: it fades out, and the faded part lifts.",
      },
      {
        versus: "water-spots",
        tell: "An island is bare. A water spot has copper inside the ring, only stained or thin.",
      },
      {
        versus: "no-deposit",
        tell: "Islands lie on open faces and move from part to part. No deposit sits in the same recess or contact point on every part.",
      },
      {
        versus: "handling",
        tell: "A finger leaves ridges or a glove leaves a weave. An island of cleaner-borne oil has neither.",
      },
      {
        versus: "pitting",
        tell: "Millimetres wide and flat, with an edge to trace. Pits are points that a nail catches.",
      },
    ],
    checks: [
      "Water break: clean, rinse, acid-dip, rinse and drain (ASTM F22). The film must leave as one sheet. Do it after the acid: soap left by the cleaner can hide oil before it.",
      "Mist fine droplets on a dry cleaned part (ASTM F21). Where they stand as beads, there is oil that the water break missed.",
      "Wipe an island with a white swab and solvent. A yellow, green or waxy swab names buffing compound; a clean swab points away from it.",
    ],
    prevention: [
      "Titrate and skim the cleaner on a set day, and write it in the log. Skim before the first rack, not after lunch.",
      "Take buffing compound off in its own hot soak, while it is still soft.",
      "Overflow rinses at the surface, so that oil leaves over the weir and not on the next rack.",
      "Read the water break on one part of every rack before the acid. It costs ten seconds.",
    ],
    stripNote:
      "At the strike it polishes off in minutes, but polishing alone smears the grease: clean again from the start. Under nickel or gold the island lifts in the strip tank first and the base metal there is attacked longest, so expect uneven metal and a repolish.",
    otherLikelihood: 0.06,
    sourceKeys: ["astm-f22", "astm-f21", "astm-b322", "common-practice", "from-memory"],
    synonyms: [
      "film tears",
      "crawls",
      "oil spots",
      "water pulls away",
      "sheds water",
      "water doesn't sheet",
      "water runs off it",
      "beading up",
      "round bare spots",
      "bare islands",
      "bare spots",
      "bare patches",
      "holidays",
      "fish eyes",
      "fisheye",
      "water break",
      "film breaks",
      "crawling",
      "pulls back",
      "beads up",
      "beading like a waxed car",
      "repels water",
      "greasy",
      "oily",
      "grease spots",
      "no wetting",
      "won't wet",
      "islands",
      "Swiss cheese",
    ],
    position: 0,
  },
  causes: [
    {
      slug: "cleaner-spent",
      classSlugs: ["dewetting", "peeling"],
      title: "Cleaner spent, weak or cold",
      station: "clean",
      why: "A cleaner that is short of alkali, loaded with oil or running cold stops lifting soil and starts to lay it back on. Enough oil left breaks the film (dewetting); a trace too thin to break it leaves copper with no grip (peeling).",
      proof:
        "Run two racks from the same lot, one through the tank, one through a fresh hot beaker of the same cleaner. If only the tank rack breaks water, it is the cleaner. Titrate it and read its temperature.",
      likelihood: 0.26,
      baseMetals: ["steel", "iron", "brass", "bronze", "copper", "nickel-silver", "zinc", "aluminium", "stainless"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
      synonyms: [
        "not clean",
        "dirty part",
        "poor cleaning",
        "grease not removed",
        "clean tank",
        "dead cleaner",
        "tired cleaner",
        "weak soap",
        "cold cleaner",
        "electrocleaner old",
        "soak tank worn out",
        "degreaser",
      ],
    },
    {
      slug: "oil-skin",
      classSlugs: ["dewetting"],
      title: "Oil skin on the cleaner or rinse",
      station: "rinse",
      why: "A clean part picks up a floating film on its way out. The oil comes from the parts, from a hoist or from a rinse that overflows below the surface.",
      proof:
        "Lay white blotting paper flat on the tank: an oily ring or rainbow settles it. Islands that line up with the waterline, or drag upward, say the same.",
      likelihood: 0.2,
      baseMetals: ["steel", "stainless", "brass", "bronze", "copper", "nickel-silver", "nickel", "zinc", "aluminium"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "oil film on the tank",
        "oil slick",
        "scum on the rinse",
        "floating oil",
        "rainbow on the water",
        "drag-out oil",
      ],
    },
    {
      slug: "buffing-compound-left",
      classSlugs: ["dewetting"],
      title: "Buffing compound left in detail",
      station: "clean",
      why: "Compound packed by heat into letters, threads and inside corners hardens with age. The soak softens its skin only, and the rest bleeds out later.",
      proof:
        "Pick a letter with a toothpick after cleaning, or swab it with solvent. Wax or colour on it proves compound; islands only in detail and never on flats point the same way.",
      likelihood: 0.18,
      baseMetals: ["brass", "zinc", "copper", "nickel-silver", "aluminium", "silver", "gold", "steel", "pewter"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "polishing compound",
        "rouge",
        "tripoli",
        "buff grease",
        "compound in the letters",
        "polish in the engraving",
        "wax in corners",
        "buffing wax",
      ],
    },
    {
      slug: "silicone-or-lacquer",
      classSlugs: ["dewetting"],
      title: "Silicone, mould release or lacquer",
      station: "clean",
      why: "Silicone and clear lacquer do not saponify, so alkaline cleaner passes over them. One sprayed bench or lacquered customer part can also seed a whole tank.",
      proof:
        "Islands come back in the same places after a good clean. A swab of the right solvent moves them (lacquer softens; silicone does not, but a light abrade cures that spot only). Ask what was sprayed near the parts.",
      likelihood: 0.1,
      baseMetals: ["brass", "silver", "zinc", "aluminium", "copper", "pewter"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "mold release",
        "silicone spray",
        "clear coat",
        "lacquered brass",
        "release agent",
        "antitarnish coating",
      ],
    },
    {
      slug: "soap-set-by-acid",
      classSlugs: ["dewetting"],
      title: "Cleaner film set by the acid",
      station: "rinse",
      why: "Cleaner carried past a short rinse meets acid: soaps fall out as fatty acid, silicates as gel. The part was clean before the acid and is not after it.",
      proof:
        "Water break holds after the cleaner rinse and fails after the acid rinse. A second warm rinse before the acid makes it go away.",
      likelihood: 0.12,
      baseMetals: ["steel", "brass", "copper", "zinc", "aluminium", "nickel-silver", "bronze"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
      synonyms: [
        "silicate film",
        "soap film",
        "cleaner dragged into acid",
        "white film after acid",
        "acid goes cloudy",
      ],
    },
    {
      slug: "strike-organics",
      classSlugs: ["dewetting", "pitting"],
      title: "Oil or organics in the strike",
      station: "strike",
      why: "Oil from an air blower, breakdown of a brightener or dragged-in cleaner rides to the surface and sticks where gas leaves it. Patches dewet or pit although the part went in clean.",
      proof:
        "Strike a known clean brass coupon. If it shows the same, treat a litre with activated carbon, filter, strike again in a beaker: a clean coupon now proves it. Hold white paper in the air stream for blower oil.",
      likelihood: 0.08,
      baseMetals: ["steel", "stainless", "brass", "bronze", "copper", "nickel-silver", "nickel", "zinc", "aluminium"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "oily air line",
        "blower oil",
        "dirty strike",
        "organic contamination",
        "strike needs carbon",
        "foam on the strike",
      ],
    },
  ],
  fixes: [
    {
      slug: "reclean-from-start",
      causeSlugs: ["cleaner-spent", "oil-skin"],
      title: "Polish back and clean from the start",
      steps: [
        polishBack({
          detail:
            "Wet, 1000 grit or finer, only until the copper around the islands is gone and no edge shows. New pad: a greasy one spreads the fault.",
        }),
        clean("Fresh hot soak, then electroclean", {
          detail:
            "Soak 3 to 5 min in fresh cleaner, then electroclean 1 to 2 min, steel anodic; brass, copper and zinc only briefly anodic, they tarnish. Zinc and aluminium need an inhibited cleaner.",
          minutes: 8,
        }),
        rinseToWaterBreak(),
        activate("Activate for the alloy", {
          detail:
            "The activator and time on the line card, no longer: polished metal needs less. Read the water break once more after it.",
        }),
        strike({ detail: "Within 30 s of the acid rinse. First copper should show in about 30 s (common practice)." }),
        photographAndTape(),
      ],
      whenNot: "Not until the tank that did it is mended; else the second round shows the same islands.",
      materials: ["1000 to 1500 grit wet paper", "fresh soak cleaner", "white blotting paper", "tape"],
      sourceKeys: ["astm-b322", "astm-f22", "common-practice", "from-memory"],
    },
    {
      slug: "renew-cleaner",
      causeSlugs: ["cleaner-spent"],
      title: "Bring the cleaner back, or make it up new",
      steps: [
        mend("clean", "Titrate and read the temperature", {
          detail: "Alkalinity against the maker's sheet and temperature with a checked thermometer, not the dial.",
          minutes: 10,
          cautionKeys: ["hot-alkali", "sheet"],
        }),
        mend("clean", "Skim, then add or dump", {
          detail:
            "Skim off floating oil. Add cleaner if it is only short of alkali. If oil stays emulsified and clouds a jar left for an hour, dump it: more alkali will not lift the soil it holds.",
          minutes: 30,
          cautionKeys: ["hot-alkali", "waste"],
        }),
        mend("clean", "Prove it on a dirty coupon", {
          detail:
            "Oil a scrap panel, clean it at the usual time, rinse, acid-dip, rinse, read the water break. Log date and result.",
          minutes: 10,
          cautionKeys: ["hot-alkali", "acid-splash", "acid-cyanide"],
        }),
      ],
      whenNot:
        "Leave the cleaner alone when a fresh beaker of it breaks water too: then look at silicone, or at what came before the line.",
      materials: ["cleaner concentrate", "titration kit", "checked thermometer", "scrap panel"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
    },
    {
      slug: "clear-oil-skin",
      causeSlugs: ["oil-skin"],
      title: "Take the oil off the tanks",
      steps: [
        mend("rinse", "Skim cleaner and rinses", {
          detail:
            "Blot or skim until white paper stays clean. Wipe the tank walls at the waterline, where oil waits for the next rack.",
          cautionKeys: ["hot-alkali", "waste"],
        }),
        mend("rinse", "Make the rinse leave over the top", {
          detail:
            "Feed at the bottom, overflow along the whole weir, opposite side. Turn the flow up until floating dust moves off.",
          minutes: 20,
        }),
        mend("rinse", "Find where it comes from", {
          detail:
            "Hoist oil, blower, parts that skipped the degrease. Write the source in the log; skimming alone buys one shift.",
          minutes: 20,
        }),
      ],
      whenNot: "Not a cure for parts already struck: those go back through the cleaner.",
      materials: ["oil blotters", "skimmer", "white paper"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "dig-out-compound",
      causeSlugs: ["buffing-compound-left"],
      title: "Dig the compound out, then re-strike",
      steps: [
        polishBack({
          detail: "Only around the islands, wet and fine. Keep the abrasive out of the letters, it packs them again.",
          minutes: 5,
        }),
        {
          title: "Soften and brush the detail",
          detail:
            "Hot compound-remover soak, 60 to 70 °C if its sheet allows, 5 to 10 min, then a soft brush along each letter and thread. Ultrasonic if the shop has it. Stubborn wax: a solvent swab, then back to the soak.",
          minutes: 4,
          perPart: true,
          cautionKeys: ["hot-alkali", "solvent"],
          station: "clean",
        },
        clean("Electroclean", { detail: "1 min at the line's setting, to lift what the brush loosened.", minutes: 4 }),
        rinseToWaterBreak({
          detail:
            "Rinse into the detail with a spray. Drain and watch the letters: a film that draws back from one letter means brush again.",
        }),
        activate("Activate for the alloy", { detail: "Line card time. Rinse the detail twice: it holds acid." }),
        strike({
          detail: "Look into the letters as the first copper comes; that is where it will fail again if it fails.",
        }),
      ],
      whenNot: "Not on soft plated-over detail that a brush would scratch; use ultrasonic and time.",
      materials: ["compound remover", "soft brush", "fine wet paper", "solvent swabs"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "strip-silicone-or-lacquer",
      causeSlugs: ["silicone-or-lacquer"],
      title: "Take silicone or lacquer off before any water",
      steps: [
        polishBack({ detail: "Take the copper off first, rinse and dry: solvent works on a dry part.", minutes: 6 }),
        {
          title: "Solvent, away from the line",
          detail:
            "Lacquer: its own thinner or stripper, wiped off with fresh rags, one direction, twice. Silicone: a silicone remover, then a light wet abrade of the face, since the last film bonds to the oxide.",
          minutes: 8,
          perPart: true,
          cautionKeys: ["solvent", "polishing-dust", "sheet"],
          station: null,
        },
        clean("Soak and electroclean", {
          detail: "Full line times in a tank you can spare: what is left of the silicone goes into it.",
          minutes: 8,
        }),
        rinseToWaterBreak(),
        activate("Activate for the alloy", { detail: "Line card time, then two rinses." }),
        strike({
          detail: "One part first. If the same places stay bare, stop and repeat the solvent; do not run the rack.",
        }),
      ],
      whenNot: "Not in the common cleaner if the part is soaked in silicone: it seeds the tank for a week.",
      materials: ["lacquer stripper or thinner", "silicone remover", "lint-free rags", "fine wet paper"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "rinse-soap-before-acid",
      causeSlugs: ["soap-set-by-acid"],
      title: "Rinse the cleaner off before the acid",
      steps: [
        polishBack({
          detail: "Wet and fine, the whole face: the film lies under copper that looks good as well.",
          minutes: 6,
        }),
        clean("Clean again", {
          detail: "Line times. A free-rinsing, low-silicate cleaner if you have one.",
          minutes: 6,
        }),
        rinse("Warm rinse, then cold, both flowing", {
          detail: "30 s at about 40 °C with movement, then 30 s cold. Warm water lets go of soap that cold water sets.",
          minutes: 3,
        }),
        activate("Activate in acid that is clear", {
          detail: "Cloudy or scummed acid is set soap: change it first. Line card time.",
        }),
        rinseToWaterBreak({ detail: "The water break that counts is this one, after the acid." }),
        strike({ detail: "Straight on, wet." }),
      ],
      whenNot: "Not enough if the acid tank itself has a skin: skim or change it before the rack goes in.",
      materials: ["warm rinse", "fresh activator if the old one is cloudy"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
    },
    {
      slug: "carbon-treat-strike",
      causeSlugs: ["strike-organics"],
      title: "Carbon-treat the strike and mend the air",
      steps: [
        mend("strike", "Prove it in a beaker", {
          detail:
            "One litre with 2 to 4 g activated carbon, stir 30 min, filter, strike a clean coupon. Go on only if it comes out whole.",
          minutes: 25,
          cautionKeys: ["cyanide", "acid-cyanide"],
        }),
        mend("strike", "Treat the tank through a carbon pack", {
          detail:
            "Sulfur-free carbon for a cyanide bath. Circulate two or more tank turnovers, change the pack, analyse copper and free cyanide after, since carbon and filtering lose some.",
          minutes: 60,
          cautionKeys: ["cyanide", "acid-cyanide", "waste"],
        }),
        mend("strike", "Mend the air", {
          detail:
            "Low-pressure blower, not the shop compressor; a filter in the line; white paper in the stream stays clean.",
          minutes: 30,
        }),
        strike({ detail: "Clean coupon first, then one part, then the rack." }),
      ],
      whenNot: "Not before the coupon proves it. Carbon in a good bath costs wetting agent and time for nothing.",
      materials: ["sulfur-free activated carbon", "filter packs", "brass coupons"],
      sourceKeys: ["common-practice", "from-memory"],
    },
  ],
};
