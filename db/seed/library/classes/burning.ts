/** Burning: more current than the bath could feed with copper. */
import type { ShelfPart } from "@/lib/library/library-entry";
import {
  activate,
  clean,
  mend,
  photographAndTape,
  polishBack,
  rinseToWaterBreak,
  strike,
} from "@/db/seed/library/steps";

export const burning: ShelfPart = {
  class: {
    slug: "burning",
    title: "Burning",
    short: "Dark, powdery edges and points where the current was more than the bath could feed.",
    atStrike:
      "Edges, corners and points nearest the anode are dark red-brown to black, rough or powdery to the nail, with sound pink copper a few millimetres in. Under a brush it shows as a dark streak where the brush stopped or ran dry.",
    inFinalPlate:
      "The powder becomes rough, nodular edges that chip. Bright nickel cannot level it, and an edge polished through after plating is bare.",
    tells: [
      {
        versus: "overactivation",
        tell: "It lies on top, at edges and points. Smut lies under the copper and follows the alloy, on flat faces too.",
      },
      {
        versus: "oxidation",
        tell: "Rough to the nail, and weak acid does not clear it. Tarnish is smooth and clears.",
      },
      {
        versus: "pitting",
        tell: "Roughness stops a little way in from the edge. Particles sit all over, most on upward faces.",
      },
    ],
    checks: [
      "Drag a nail across the dark edge: powder or grit is burning.",
      "Run one part at half the voltage. The dark line moves outward or goes.",
      "Clamp meter on the rack lead: amps over dm² of what hangs, against the bath's range.",
    ],
    prevention: [
      "Set current from the area on the rack, not from habit, and ramp up instead of switching on at full.",
      "Shield or rob sharp points; keep anodes at even distance.",
      "Brush: keep it wet and moving; start at 2 V and rise to 4 V (common practice).",
    ],
    stripNote:
      "At the strike only the edges need wet abrasive. Under final plate the edge has to come down through every layer, and a sharp edge loses its shape.",
    otherLikelihood: 0.07,
    sourceKeys: ["guidebook-copper", "guidebook-brush", "common-practice", "from-memory"],
    synonyms: [
      "burn",
      "burning",
      "trees",
      "whiskers",
      "coarse edges",
      "sooty edges",
      "rough edges",
      "charred",
      "spongy edges",
      "dark corners",
      "high current",
      "fluffy edges",
      "burnt",
      "burned",
      "burnt edges",
      "crispy",
      "crispy corners",
      "toasted",
      "cindery",
      "black edges",
      "powdery",
      "scorched",
      "treeing",
      "dark edges",
      "burn marks",
      "overheated edge",
    ],
    position: 5,
  },
  causes: [
    {
      slug: "strike-voltage-high",
      classSlugs: ["burning"],
      title: "Voltage or current too high",
      station: "strike",
      why: "Past its limit the bath cannot bring copper to the edge fast enough; hydrogen and powder come instead. Few parts on a rectifier set for many does the same.",
      proof:
        "Amps per dm² above the range (0.5 to 4 for a cyanide strike, guidebook). Half the voltage on the next rack and the edge stays pink.",
      likelihood: 0.4,
      baseMetals: [
        "steel",
        "stainless",
        "brass",
        "bronze",
        "copper",
        "nickel-silver",
        "nickel",
        "zinc",
        "aluminium",
        "silver",
      ],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
      synonyms: [
        "voltage too high",
        "too many amps",
        "current too high",
        "cranked up",
        "volts up",
        "overcurrent",
        "rectifier set too high",
      ],
    },
    {
      slug: "anode-too-close",
      classSlugs: ["burning"],
      title: "Anode too close, or brush dry or still",
      station: "strike",
      why: "Current takes the short way. A part swung towards the anode, or a brush that stops or runs dry, gets all of it on one spot.",
      proof:
        "Dark side faces the anode, or the streak matches the brush. Turn the part or move the brush faster: the dark moves or goes.",
      likelihood: 0.22,
      baseMetals: ["steel", "stainless", "brass", "bronze", "copper", "nickel-silver", "zinc", "silver", "gold"],
      sourceKeys: ["guidebook-brush", "common-practice", "from-memory"],
      synonyms: [
        "brush held still",
        "dry brush",
        "brush streak",
        "stylus burn",
        "swab dry",
        "too near the anode",
        "no shield",
      ],
    },
    {
      slug: "bath-lean-or-cold",
      classSlugs: ["burning"],
      title: "Strike lean in copper, cold, or high in free cyanide",
      station: "strike",
      why: "Little copper in reach lowers the current that the edge stands. Cold and too much free cyanide do the same.",
      proof:
        "Analysis: copper and free cyanide (11 to 15 g/L in the guidebook's strike), temperature 24 to 66 °C. A Hull cell with copper cyanide added widens the good range.",
      likelihood: 0.19,
      baseMetals: ["steel", "stainless", "brass", "bronze", "copper", "nickel-silver", "zinc", "aluminium"],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
      synonyms: ["low copper", "cold strike", "free cyanide high", "low metal", "bath out of balance"],
    },
    {
      slug: "agitation-stopped",
      classSlugs: ["burning"],
      title: "Agitation stopped",
      station: "strike",
      why: "Still solution starves the edge at a current that is right when it moves.",
      proof: "Air or bar was off, or blocked at one end: the burnt racks are those that hung there.",
      likelihood: 0.12,
      baseMetals: ["steel", "brass", "bronze", "copper", "nickel-silver", "zinc"],
      sourceKeys: ["common-practice", "from-memory"],
      synonyms: ["air off", "no agitation", "still bath", "pump stopped", "blower off"],
    },
  ],
  fixes: [
    {
      slug: "dress-edges-lower-current",
      causeSlugs: ["strike-voltage-high", "anode-too-close", "agitation-stopped", "bath-lean-or-cold"],
      title: "Dress the edges back and re-strike lower",
      steps: [
        polishBack({
          detail: "Wet 800 to 1200 grit on the dark edges until no powder comes and the step to sound copper is gone.",
          minutes: 5,
        }),
        clean("Electroclean", { detail: "1 min.", minutes: 4 }),
        rinseToWaterBreak(),
        activate("Short activation", { detail: "Line card time, low end: part of the face is copper already." }),
        strike({
          detail:
            "Start at half the voltage and raise until first copper comes at about 30 s. Bath window 0.8 V at 54 °C with air; brush 2 rising to 4 V (common practice). Agitation on first.",
        }),
        photographAndTape(),
      ],
      whenNot: "Not when the edge is rough under the abrasive too: then the base metal edge is burred, deburr first.",
      materials: ["800 to 1200 grit wet paper", "clamp meter", "shield or robber wire"],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
    },
    {
      slug: "brush-restrike",
      causeSlugs: ["anode-too-close"],
      title: "Burnt under the brush: dress, then brush again wet and moving",
      steps: [
        polishBack({
          detail: "Wet 1000 grit along the streak until no powder comes. Rinse the grit off the work and the tray.",
          minutes: 4,
        }),
        {
          title: "Electroclean and activate by brush",
          detail:
            "Each with its own anode, cover and tray, in the order and polarity on the solution's sheet. Rinse with clean water between them, until the run-off is neutral.",
          minutes: 6,
          perPart: true,
          cautionKeys: ["brush-power", "acid-cyanide", "acid-splash", "embrittlement", "sheet"],
          station: "activate",
        },
        {
          title: "Strike by brush, 2 V rising to 4 V",
          detail:
            "Room temperature (common practice). Start at 2 V on a flooded cover, keep it moving, raise only once copper covers. A squeak or dry drag means stop and dip again.",
          minutes: 6,
          perPart: true,
          cautionKeys: ["brush-power", "acid-cyanide", "sheet", "waste"],
          station: "strike",
        },
        photographAndTape(),
      ],
      whenNot: "Not with a worn cover: graphite through the cotton arcs and burns again.",
      materials: ["anode covers", "brush activator", "brush copper strike", "1000 grit wet paper"],
      sourceKeys: ["guidebook-brush", "common-practice", "from-memory"],
    },
    {
      slug: "rebalance-strike",
      causeSlugs: ["bath-lean-or-cold", "agitation-stopped"],
      title: "Warm, feed and stir the strike",
      steps: [
        mend("strike", "Temperature and air first", {
          detail: "Both cost nothing. Wait until the tank is at its window at both ends.",
          minutes: 20,
        }),
        mend("strike", "Analyse, then add", {
          detail:
            "Copper and free cyanide by titration. Additions only by those trained for cyanide, dissolved outside the tank in alkali.",
          minutes: 40,
          cautionKeys: ["cyanide", "acid-cyanide", "sheet"],
        }),
        mend("strike", "Hull cell or coupon", {
          detail: "The good range must cover the current that the rack needs. Log all three numbers.",
          minutes: 15,
          cautionKeys: ["cyanide", "power"],
        }),
      ],
      whenNot:
        "Not by adding without analysis: too little free cyanide is the next fault (immersion deposit, dark anodes).",
      materials: ["titration kit", "Hull cell", "thermometer"],
      sourceKeys: ["guidebook-copper", "common-practice", "from-memory"],
    },
  ],
};
