/** Overactivation: the acid went too far and left smut under the copper. Long because it is content: one class, whole. */
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

export const overactivation: ShelfPart = {
  class: {
    slug: "overactivation",
    title: "Overactivation",
    short: "Dark smut under the copper: the acid ate the base metal and left what does not dissolve.",
    atStrike:
      "Copper is grey-brown, smoky or sooty, over the whole part or where the acid worked hardest: edges, machined faces, thin walls. A wet white cloth comes away black. Below it the base metal is matt, etched or shows its grain. Tape lifts copper with black on its back.",
    inFinalPlate:
      "A dull, rough final plate over a dark bed. Bright nickel copies the etch, gold turns brownish, and adhesion fails in the burnish or bend test with black on both faces. Dimensions of fine threads and edges may be gone for good.",
    tells: [
      {
        versus: "underactivation",
        tell: "The cloth turns black and the base metal looks etched. Underactivation is pale, the cloth stays clean, the base metal keeps its polish.",
      },
      {
        versus: "burning",
        tell: "The dark lies under the copper and follows the alloy and the acid. Burning lies on top, at edges and points nearest the anode.",
      },
      {
        versus: "oxidation",
        tell: "It is there as the part leaves the strike. Oxidation grows while the part waits, and shows colours before it shows black.",
      },
      {
        versus: "bleed-out",
        tell: "It covers faces. Bleed-out starts at a seam or a pore and creeps outward after the strike.",
      },
    ],
    checks: [
      "Before the strike: wipe the activated part with a wet white cloth. Black now means smut now, and the strike is not to blame.",
      "Look at the wiped base metal under a loupe: an even etch with raised grain is acid; polished metal is not.",
      "Halve the time in the activator on one part. A clean cloth settles it.",
    ],
    prevention: [
      "A timer and a posted time per alloy. Zinc die cast, leaded brass and high-carbon steel are the ones that do not forgive.",
      "Keep the alloys apart: acid that has seen copper alloys is not for steel or zinc.",
      "Lower strength and a longer time are easier to hold than strong acid and a second too much.",
      "Inhibited acid, or an anodic alkaline derust, for hardened and high-carbon steel.",
    ],
    stripNote:
      "At the strike, copper and smut leave together under wet abrasive, but an etched face must be refinished before it goes back. Under final plate the strip acid finds the same weak metal and digs on: check fits and threads first, the part may be scrap already.",
    otherLikelihood: 0.06,
    sourceKeys: ["astm-b242", "astm-b252", "astm-b281", "common-practice", "from-memory"],
    synonyms: [
      "black stuff",
      "black film",
      "turned black",
      "went black",
      "black residue",
      "dark film",
      "grey film",
      "etched",
      "etched look",
      "matt and dark",
      "charcoal",
      "burnt by acid",
      "acid burn",
      "ate the part",
      "rubs off black",
      "pickled too long",
      "smut",
      "dark smut",
      "black smut",
      "smoky",
      "smokey copper",
      "sooty",
      "soot",
      "black on the rag",
      "black wipe",
      "over pickled",
      "overpickled",
      "over etched",
      "overetched",
      "too much acid",
      "eaten",
      "dark under the copper",
      "dirty copper",
      "grey copper",
      "gray",
      "muddy",
      "over activated",
    ],
    position: 2,
  },
  causes: [
    {
      slug: "activator-dwell-long",
      classSlugs: ["overactivation"],
      title: "Left too long in the activator",
      station: "activate",
      why: "The oxide was gone in the first seconds. After that acid dissolves the alloy unevenly and leaves carbon, lead, silicon or copper as loose black.",
      proof: "Time three racks with a watch. One part at half the time that comes off clean on the cloth proves it.",
      likelihood: 0.3,
      baseMetals: ["steel", "iron", "brass", "bronze", "zinc", "aluminium", "nickel-silver"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "pickled too long",
        "too long in acid",
        "overdone",
        "forgotten in the acid",
        "left in the dip",
        "dwell too long",
        "soaked too long",
        "left too long in the activator",
        "over soaked",
      ],
    },
    {
      slug: "activator-strong-or-warm",
      classSlugs: ["overactivation"],
      title: "Activator too strong or too warm",
      station: "activate",
      why: "A fresh make-up at the wrong strength, or a summer tank, works at several times the speed that the posted time was written for.",
      proof:
        "Titrate, and read the temperature. Dilute a litre to the card's strength, run one part for the card's time: clean means the strength was wrong.",
      likelihood: 0.2,
      baseMetals: ["steel", "iron", "brass", "bronze", "zinc", "aluminium"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: [
        "acid too strong",
        "hot acid",
        "fresh acid bites",
        "too concentrated",
        "acid too warm",
        "strong pickle",
      ],
    },
    {
      slug: "carbon-smut",
      classSlugs: ["overactivation"],
      title: "Carbon smut on high-carbon steel or cast iron",
      station: "activate",
      why: "Acid takes the iron and leaves carbide and graphite standing. Tool steel, case-hardened faces and cast iron go black in the time that suits mild steel.",
      proof:
        "Wipe after the acid: black that returns with every dip and comes faster than before is carbon. Mild steel in the same dip stays clean.",
      likelihood: 0.14,
      baseMetals: ["steel", "iron"],
      sourceKeys: ["astm-b242", "common-practice", "from-memory"],
      synonyms: [
        "graphite",
        "carbide",
        "case hardened black",
        "tool steel smut",
        "cast iron black",
        "carbon smut",
        "4140 turns black",
      ],
    },
    {
      slug: "leaded-alloy-smut",
      classSlugs: ["overactivation"],
      title: "Lead smut on leaded brass or bronze",
      station: "activate",
      why: "Sulfuric acid turns the lead of C360 and its kin into lead sulfate, which no rinse takes off; hydrochloric leaves lead chloride. Fluoboric acid keeps it in solution.",
      proof:
        "Dip one part in 5 to 10 % fluoboric acid instead. White cloth clean and copper bright settles it. The mill certificate or the alloy number does too.",
      likelihood: 0.12,
      baseMetals: ["brass", "bronze", "nickel-silver"],
      sourceKeys: ["astm-b281", "common-practice", "from-memory"],
      synonyms: [
        "leaded brass",
        "free cutting brass",
        "C360 smut",
        "lead sulfate",
        "white grey film on brass",
        "screw machine brass",
        "grey in sulfuric",
      ],
    },
    {
      slug: "zinc-or-aluminium-attacked",
      classSlugs: ["overactivation"],
      title: "Zinc or aluminium alloy attacked",
      station: "activate",
      why: "Zinc die cast wants 0.25 to 1 % sulfuric and stops at the first gas, 10 to 30 s. Aluminium etch leaves copper and silicon of the alloy as black that only the right desmut takes.",
      proof:
        "Zinc: a part through 0.5 % acid for 10 s wipes clean. Aluminium: a second desmut with fluoride clears the black where plain nitric did not.",
      likelihood: 0.1,
      baseMetals: ["zinc", "aluminium"],
      sourceKeys: ["astm-b252", "astm-b253", "guidebook-aluminium", "from-memory"],
      synonyms: [
        "zamak went black",
        "pot metal black",
        "die cast black",
        "silicon smut",
        "desmut missed",
        "A380 black",
        "gassing in the acid",
      ],
    },
    {
      slug: "activator-copper-loaded",
      classSlugs: ["overactivation", "immersion-deposit"],
      title: "Activator loaded with copper",
      station: "activate",
      why: "Acid that has dissolved brass, racks or fallen parts holds copper. Steel and zinc trade it for themselves: a loose red or dark film is on the part before the strike.",
      proof: "Hang a clean steel nail in the activator for a minute. Red on the nail proves it.",
      likelihood: 0.08,
      baseMetals: ["steel", "iron", "zinc", "aluminium", "stainless"],
      sourceKeys: ["crc-potentials", "common-practice", "from-memory"],
      synonyms: [
        "copper in the acid",
        "bath full of copper",
        "metal in the acid",
        "acid went blue",
        "green acid",
        "copper in the pickle",
        "red film in the acid",
        "nail test red",
        "contaminated acid",
        "blue acid",
      ],
    },
  ],
  fixes: [
    {
      slug: "polish-smut-and-shorten",
      causeSlugs: ["activator-dwell-long", "activator-strong-or-warm"],
      title: "Polish smut off, shorter and weaker acid, re-strike",
      steps: [
        {
          title: "Measure fits and threads first",
          detail:
            "Gauge what the drawing holds tight. Metal that the acid took does not come back; a part already under size goes to the senior, not to the polisher.",
          minutes: 2,
          perPart: true,
          cautionKeys: [],
          station: null,
        },
        polishBack({
          detail:
            "Wet, start at 600 to 800 grit if it is etched, finish at the job's grit. Go on until a white cloth stays white.",
          minutes: 10,
          cautionKeys: ["lead-dust"],
        }),
        clean("Electroclean, anodic", {
          detail: "1 to 2 min anodic on steel: it lifts the last smut. Brass and zinc 10 to 20 s at most.",
          minutes: 5,
        }),
        rinseToWaterBreak({ detail: "Two rinses. The film holds, and a cloth after the rinse is white." }),
        activate("Half the time, card strength", {
          detail:
            "Titrated acid at room temperature, half the old time by a timer. Wipe one part: any grey, take it out sooner.",
        }),
        strike({ detail: "At once. Copper should come pink, not brown." }),
      ],
      whenNot: "Not when the face is pitted or out of size: refinishing, concession or scrap is a senior's call.",
      materials: ["600 to 1200 grit wet paper", "white cloth", "timer", "gauges"],
      sourceKeys: ["astm-b322", "iso-9000", "common-practice", "from-memory"],
    },
    {
      slug: "correct-activator-strength",
      causeSlugs: ["activator-strong-or-warm"],
      title: "Bring the activator back to strength",
      steps: [
        mend("activate", "Titrate and measure", {
          detail: "Acid by titration, temperature by thermometer, at the end of the tank where parts hang.",
          minutes: 10,
          cautionKeys: ["acid-splash", "sheet"],
        }),
        mend("activate", "Dilute", {
          detail:
            "Draw strong acid off to the acid line, then add it to water again at the card's strength. Never top up a strong tank with a hose.",
          minutes: 20,
          cautionKeys: ["acid-splash", "acid-cyanide", "waste"],
        }),
        mend("activate", "Write a window", {
          detail:
            "Strength, temperature and time per alloy on a card at the tank; above the temperature, the shorter time.",
          minutes: 10,
        }),
        mend("activate", "Prove it", {
          detail: "One part of the touchiest alloy that the tank serves, wiped with a white cloth after the acid.",
          minutes: 5,
          cautionKeys: ["acid-splash", "acid-cyanide", "embrittlement"],
        }),
      ],
      whenNot: "Not if the acid is loaded with copper: dilution leaves the copper in it. Dump it.",
      materials: ["titration kit", "thermometer"],
      sourceKeys: ["common-practice", "from-memory"],
    },
    {
      slug: "desmut-carbon-anodic",
      causeSlugs: ["carbon-smut"],
      title: "High-carbon steel and iron: scrub, anodic, barely any acid",
      steps: [
        polishBack({
          detail: "Wet abrasive or pumice and a stiff brush until the cloth is white; cast iron keeps a grey tone.",
        }),
        clean("Anodic electroclean", {
          detail: "2 to 3 min anodic in alkaline cleaner. It lifts carbon without putting hydrogen in.",
          minutes: 6,
        }),
        rinseToWaterBreak(),
        activate("Dip, 3 to 10 s", {
          detail: "5 to 10 % sulfuric or inhibited hydrochloric, in and out. Wipe one: grey means less still.",
        }),
        strike({
          detail:
            "Live entry, at the high end of the window for the first 10 s: cast iron starts badly at low current.",
          cautionKeys: ["live-entry"],
        }),
        photographAndTape(),
      ],
      whenNot:
        "Not hardened or spring steel without an engineer: stress relief comes before any acid (ASTM B849). Not porous iron that has soaked acid: see bleed-out first.",
      materials: ["pumice", "stiff brush", "anodic cleaner", "inhibited acid"],
      sourceKeys: ["astm-b242", "astm-b849", "common-practice", "from-memory"],
    },
    {
      slug: "fluoboric-for-leaded",
      causeSlugs: ["leaded-alloy-smut"],
      title: "Leaded alloy: fluoboric acid in place of sulfuric",
      steps: [
        polishBack({
          detail: "Wet only: the dust holds lead. Until the grey is gone and the yellow is even.",
          cautionKeys: ["lead-dust"],
        }),
        clean("Mild electroclean", { detail: "Cathodic, then 5 to 10 s anodic, low current.", minutes: 4 }),
        rinseToWaterBreak(),
        {
          title: "Fluoboric acid, 15 to 30 s",
          detail: "5 to 10 % by volume, room temperature (common practice). No grey may show. Two rinses.",
          minutes: 3,
          perPart: false,
          cautionKeys: ["hydrofluoric", "acid-cyanide", "acid-splash", "sheet"],
          station: "activate",
        },
        strike({ detail: "At once. Pink and even, no grey in the threads." }),
        photographAndTape(),
      ],
      whenNot:
        "Not in a shop without fluoride training: fluoboric acid holds free hydrofluoric. A shorter, weaker sulfuric dip and a scrub is the lesser cure.",
      materials: ["fluoboric acid", "wet paper"],
      sourceKeys: ["astm-b281", "common-practice", "from-memory"],
    },
    {
      slug: "gentle-zinc-route",
      causeSlugs: ["zinc-or-aluminium-attacked"],
      title: "Zinc die cast: polish, gentle acid, live entry",
      steps: [
        polishBack({
          detail:
            "A soft wheel or 1200 grit wet, lightly: the dense skin is thin (common practice), and porosity waits below it.",
        }),
        clean("Zinc-safe electroclean", {
          detail: "30 to 45 s, mild cleaner, anodic at low current only as its maker allows.",
          minutes: 4,
        }),
        rinseToWaterBreak(),
        activate("Half-percent sulfuric, to the first gas", {
          detail: "0.25 to 1 % by volume, 10 to 30 s. At the first even gas it is done. Rinse twice at once.",
          cautionKeys: [],
        }),
        strike({
          detail:
            "Live entry, full cover in the first minute; 3 to 5 µm of copper before any acid bath (guidebook, strike-plate).",
          minutes: 8,
          cautionKeys: ["live-entry"],
        }),
        photographAndTape(),
      ],
      whenNot: "Not when the skin is polished through and pores show: hold for the senior.",
      materials: ["0.5 % sulfuric acid", "zinc-safe cleaner", "soft wheel"],
      sourceKeys: ["astm-b252", "guidebook-copper", "common-practice", "from-memory"],
    },
    {
      slug: "fluoride-desmut-aluminium",
      causeSlugs: ["zinc-or-aluminium-attacked"],
      title: "Aluminium: take the silicon smut off before zincate",
      steps: [
        {
          title: "Strip in nitric",
          detail:
            "Three rinses first: no cyanide of the strike may ride into the acid. 50 % by volume until copper and zincate are gone.",
          minutes: 3,
          perPart: false,
          cautionKeys: ["nitric", "acid-cyanide", "acid-splash", "waste"],
          station: "activate",
        },
        {
          title: "Fluoride desmut",
          detail:
            "Nitric 50 %, sulfuric 20 to 25 % by volume with ammonium bifluoride 120 to 240 g/L (guidebook), 3 to 10 s, until light and even. Rinse twice.",
          minutes: 3,
          perPart: false,
          cautionKeys: ["hydrofluoric", "nitric", "acid-cyanide", "acid-splash"],
          station: "activate",
        },
        {
          title: "Zincate twice",
          detail: "As on the aluminium card; a dark, spongy second coat means smut is still there.",
          minutes: 6,
          perPart: false,
          cautionKeys: ["nitric", "hot-alkali", "acid-cyanide"],
          station: "activate",
        },
        strike({ detail: "Live entry, at once.", cautionKeys: ["live-entry"] }),
        photographAndTape(),
      ],
      whenNot: "Not pure or low-silicon alloys: plain nitric is enough, and fluoride etches them for nothing.",
      materials: ["nitric acid", "sulfuric acid", "ammonium bifluoride", "zincate"],
      sourceKeys: ["astm-b253", "guidebook-aluminium", "common-practice", "from-memory"],
    },
    {
      slug: "dump-coppered-acid",
      causeSlugs: ["activator-copper-loaded"],
      title: "Dump the coppered acid and split the tanks",
      steps: [
        mend("activate", "Nail test, then empty", {
          detail:
            "A clean nail for a minute. Red: pump the acid to treatment, and fish fallen parts off the floor of the tank.",
          minutes: 25,
          cautionKeys: ["acid-splash", "acid-cyanide", "waste"],
        }),
        mend("activate", "Make up new, and label it", {
          detail:
            "Steel and zinc in one tank, copper alloys in another. The label says which, and plated racks stay out of the first.",
          minutes: 20,
          cautionKeys: ["acid-cyanide", "acid-splash", "sheet"],
        }),
        polishBack({
          detail: "Parts that carry the loose film: wet abrasive to bare metal. It does not clean off.",
          minutes: 6,
        }),
        clean("Electroclean, anodic", { detail: "1 to 2 min for steel; zinc by its own card.", minutes: 5 }),
        activate("New acid, card time", {
          detail: "The part leaves it with no red on it, or the acid is not new enough.",
        }),
        strike({ detail: "Current on before or as the part goes in." }),
      ],
      whenNot: "Not for copper alloys: they cannot pick copper up from acid.",
      materials: ["fresh acid", "steel nails", "tank labels"],
      sourceKeys: ["crc-potentials", "common-practice", "from-memory"],
    },
    {
      slug: "wipe-smut-wet",
      causeSlugs: ["activator-dwell-long"],
      title: "Smut seen before the strike: scrub it and go on",
      steps: [
        rinse("Rinse the acid off", {
          detail: "Two rinses, straight away: acid left on goes on making smut.",
          minutes: 2,
          cautionKeys: ["acid-cyanide"],
        }),
        {
          title: "Scrub wet",
          detail:
            "Pumice and a soft brush until a white cloth stays white. Etched grain under the loupe means stop: polish instead.",
          minutes: 4,
          perPart: true,
          cautionKeys: ["polishing-dust"],
          station: null,
        },
        clean("Short anodic electroclean", { detail: "15 to 30 s.", minutes: 3 }),
        rinseToWaterBreak(),
        activate("Quick dip, 5 s", { detail: "Only to neutralise. In, out, two rinses." }),
        strike({ detail: "At once; wipe the first part's copper with a cloth." }),
      ],
      whenNot: "Not after the strike: copper over smut hides it and has to come off.",
      materials: ["pumice", "soft brush", "white cloth"],
      sourceKeys: ["astm-b322", "common-practice", "from-memory"],
    },
  ],
};
