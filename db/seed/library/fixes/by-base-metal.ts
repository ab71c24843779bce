/** Routes that belong to one base metal: what its own oxide, alloying or softness asks for. Long because it is content. */
import type { LibraryFix } from "@/lib/library/library-entry";
import {
  activate,
  clean,
  nickelStrike,
  photographAndTape,
  polishBack,
  rinseToWaterBreak,
  strike,
} from "@/db/seed/library/steps";

export const fixesByBaseMetal: LibraryFix[] = [
  {
    slug: "nickel-silver-route",
    causeSlugs: ["activator-wrong", "repassivated-in-transfer"],
    title: "Nickel silver: cathodic clean, hydrochloric, strike wet",
    steps: [
      polishBack({
        detail: "Wet, 1000 grit, past the haze. Up to a fifth of this alloy is nickel: keep the dust wet.",
        cautionKeys: ["nickel"],
      }),
      clean("Electroclean, cathodic to the end", {
        detail: "1 min cathodic. Anodic makes the nickel in it passive and browns the zinc.",
        minutes: 4,
      }),
      rinseToWaterBreak(),
      activate("Hydrochloric dip, 15 to 30 s", {
        detail: "10 to 20 % by volume, room temperature (common practice), on to the strike in under 15 s.",
        cautionKeys: [],
      }),
      strike({ detail: "Live entry. Copper whole in 30 s, or the part goes through the nickel strike first." }),
      photographAndTape(),
    ],
    whenNot:
      "Not steel or zinc in the same rack. Not leaded nickel silver (key stock, screw-machine work): lead chloride stays on it, take the leaded-alloy card.",
    materials: ["hydrochloric acid", "1000 grit wet paper", "timer"],
    sourceKeys: ["astm-b281", "common-practice", "from-memory"],
  },
  {
    slug: "beryllium-copper-oxide",
    causeSlugs: ["scale-left"],
    title: "Beryllium copper: take the heat-treat oxide off in acid, never dry",
    steps: [
      {
        title: "Prove the alloy before anybody abrades it",
        detail:
          "Job card or certificate: C17200, C17500, 'BeCu'. Unsure counts as yes. From here on the part stays wet, and no blast or wheel touches it.",
        minutes: 5,
        perPart: false,
        cautionKeys: ["beryllium"],
        station: null,
      },
      activate("Warm sulfuric until the black lets go", {
        detail:
          "No cyanide on the part: three rinses first. 20 % by volume at about 50 °C, 1 to 5 min (from memory). Wipe it under water with a soft brush, never in air.",
        minutes: 6,
        cautionKeys: ["beryllium", "waste"],
      }),
      activate("Sulfuric with peroxide, seconds", {
        detail: "The shop's peroxide bright dip, 5 to 15 s, until it is one even pink. Two rinses.",
        cautionKeys: ["peroxide-dip", "beryllium"],
      }),
      strike({ detail: "At once: this face browns in minutes." }),
      photographAndTape(),
    ],
    whenNot:
      "Not steel, and not by dry abrasion of any kind. Tight springs: acid takes metal, so gauge first; past tolerance it is the senior's.",
    materials: ["sulfuric acid", "peroxide bright dip", "soft brush"],
    sourceKeys: ["astm-b281", "osha-1024", "common-practice", "from-memory"],
  },
  {
    slug: "aluminium-bronze-route",
    causeSlugs: ["activator-wrong"],
    title: "Aluminium or silicon bronze: fluoride in the acid, then strike",
    steps: [
      polishBack({ detail: "Wet, fine, to even metal. It thins the film that no plain acid takes." }),
      clean("Hot soak, then cathodic electroclean", {
        detail: "Line soak, then 1 min cathodic. Anodic current grows the alumina back.",
        minutes: 7,
      }),
      rinseToWaterBreak(),
      activate("Sulfuric 5 to 10 % with bifluoride, 15 to 30 s", {
        detail:
          "Ammonium bifluoride about 20 to 30 g/L in it (from memory). Plain sulfuric leaves alumina on C630 and C954 and silica on C655. Two rinses.",
        cautionKeys: ["hydrofluoric"],
      }),
      strike({ detail: "Live entry, at once; the film is back in a minute.", cautionKeys: ["live-entry"] }),
      photographAndTape(),
    ],
    whenNot: "Not steel in the same rack. Not in a shop without fluoride training and exhaust: send it out.",
    materials: ["sulfuric acid", "ammonium bifluoride", "fine wet paper"],
    sourceKeys: ["astm-b281", "common-practice", "from-memory"],
  },
  {
    slug: "silver-lift-tarnish",
    causeSlugs: ["silver-tarnish-left"],
    title: "Silver and karat gold: lift sulfide and fire scale, no hydrochloric",
    steps: [
      polishBack({
        detail: "Wet rouge or 1500 grit, copper off. Chased work: a soft brush and pumice, not paper.",
        cautionKeys: ["silver-dust"],
      }),
      clean("Cathodic electroclean until the yellow is gone", {
        detail: "1 to 2 min cathodic: it turns sulfide back to metal. A brown shadow that stays is not tarnish.",
        minutes: 5,
      }),
      activate("Warm sulfuric for fire scale", {
        detail:
          "10 % by volume, 50 to 60 °C, 2 to 5 min, glass or plastic tongs: steel in it plates copper on the silver. Not hydrochloric, its silver chloride stays on. Two rinses.",
        minutes: 6,
        cautionKeys: [],
      }),
      rinseToWaterBreak(),
      strike({ detail: "Live entry, low current for the first 10 s: silver is soft, and quick to take loose copper." }),
      photographAndTape(),
    ],
    whenNot:
      "Not filled, soldered-shut or stone-set work in warm acid. Grey-purple fire stain under sterling's skin is no film: polish it out or plate over it, the customer says which.",
    materials: ["wet rouge", "sulfuric acid", "plastic tongs"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "pewter-gentle-route",
    causeSlugs: ["pewter-darkened"],
    title: "Pewter and tin: mild and brief, no anodic, no heat",
    steps: [
      polishBack({
        detail: "Soft cloth wheel or 1500 wet, light hand: it smears and cuts fast.",
        cautionKeys: ["lead-dust"],
      }),
      clean("Mild soak by hand, short cathodic", {
        detail: "A buffered cleaner under 50 °C, 1 min; cathodic 15 s at most. Caustic and anodic current eat tin.",
        minutes: 4,
      }),
      rinseToWaterBreak(),
      activate("Fluoboric or methanesulfonic, 5 to 10 s", {
        detail:
          "5 to 10 % by volume (from memory). Out while it is still white: grey is antimony and copper left standing.",
        cautionKeys: ["hydrofluoric"],
      }),
      strike({
        detail: "Live entry at the cool end of the window, cover in the first half minute. Look at thin rims first.",
        cautionKeys: ["live-entry"],
      }),
      photographAndTape(),
    ],
    whenNot:
      "Not an oven, a hot rinse or a press near it: old leaded pewter softens near 180 °C (from memory). Not nitric acid at any strength.",
    materials: ["buffered cleaner", "fluoboric or methanesulfonic acid", "soft wheel"],
    sourceKeys: ["common-practice", "from-memory"],
  },
  {
    slug: "sulfur-stainless-smut",
    causeSlugs: ["activator-dwell-long"],
    title: "Free-machining stainless (303, 416): scrub the smut off, cathodic acid, nickel strike",
    steps: [
      polishBack({
        detail: "Wet, 1000 grit or pumice, until a white cloth stays white: the black is sulfide that acid laid open.",
        cautionKeys: ["nickel"],
      }),
      clean("Anodic electroclean", { detail: "1 min, to lift what the scrub loosened.", minutes: 4 }),
      rinseToWaterBreak(),
      activate("Cathodic in sulfuric, not a soak in hydrochloric", {
        detail:
          "10 to 20 % by volume, part cathodic at low current, 30 to 60 s (from memory): it takes the film without digging sulfide out.",
        cautionKeys: ["embrittlement", "power"],
      }),
      nickelStrike({ detail: "1 to 2 min. No wait in the bath without current: its acid smuts 303 as well." }),
      strike({ detail: "Two full rinses, then in wet. Cloth, then tape, on the first part." }),
    ],
    whenNot: "Not hardened 416 or springs: cathodic acid puts hydrogen in. Hold those for an engineer.",
    materials: ["pumice", "sulfuric acid", "Woods nickel strike"],
    sourceKeys: ["astm-b254", "woods-columns", "from-memory"],
  },
  {
    slug: "msa-for-leaded",
    causeSlugs: ["leaded-alloy-smut"],
    title: "Leaded brass without fluoride: methanesulfonic acid",
    steps: [
      polishBack({
        detail: "Wet only, until the grey is gone from flats and threads.",
        cautionKeys: ["lead-dust"],
      }),
      clean("Cathodic electroclean", {
        detail: "30 to 60 s cathodic and out: anodic current brings the lead up again.",
        minutes: 4,
      }),
      rinseToWaterBreak(),
      activate("Methanesulfonic acid, 15 to 45 s", {
        detail:
          "5 to 15 % by volume, room temperature (from memory). Its lead salt dissolves, where sulfate and chloride stay on. Slower than fluoboric: wipe one part before the rack.",
        cautionKeys: [],
      }),
      strike({ detail: "At once. A grey thread in the copper means lead is still there." }),
      photographAndTape(),
    ],
    whenNot:
      "Not steel. Not an acid already blue with copper, and never topped up with sulfuric: that brings lead sulfate back.",
    materials: ["methanesulfonic acid", "wet paper", "white cloth"],
    sourceKeys: ["astm-b281", "common-practice", "from-memory"],
  },
  {
    slug: "wake-solder",
    causeSlugs: ["solder-not-activated"],
    title: "Soft solder on the part: scrape it bright, fluoboric, live entry",
    steps: [
      {
        title: "Scrape the seam bright",
        detail:
          "Copper off the joint and a finger's width round it; then scraper or wet pumice along the solder until it is one bright line.",
        minutes: 5,
        perPart: true,
        cautionKeys: ["lead-dust", "polishing-dust"],
        station: null,
      },
      clean("Mild cathodic electroclean", { detail: "30 s, no anodic: solder blackens.", minutes: 4 }),
      rinseToWaterBreak({ detail: "Spray into the joint. The film must cross solder and base metal as one sheet." }),
      activate("Fluoboric acid, 10 to 20 s", {
        detail:
          "5 to 10 % by volume (common practice): sulfuric turns the seam to white lead sulfate that no copper crosses. Two rinses.",
        cautionKeys: ["hydrofluoric"],
      }),
      strike({ detail: "Live entry, lamp on the seam for the first half minute.", cautionKeys: ["live-entry"] }),
      photographAndTape({
        detail: "Photograph the joint close up. Tape across it, from base metal on to solder and off.",
      }),
    ],
    whenNot:
      "Not steel parts with a sealed seam: see bleed-out. Not a joint that carries load or current without its engineer.",
    materials: ["scraper", "fluoboric acid", "lamp"],
    sourceKeys: ["astm-b281", "common-practice", "from-memory"],
  },
  {
    slug: "strip-old-chromium",
    causeSlugs: ["old-plate-left"],
    title: "Old chromium under the copper: strip it by base metal, then prove it gone",
    steps: [
      polishBack({ detail: "Copper off, all of it. Chromium shows blue-white beside yellowish nickel.", minutes: 6 }),
      {
        title: "Strip the chromium",
        detail:
          "Over nickel or copper alloy: hydrochloric 125 mL/L at 43 to 54 °C, minutes (trade column), no cyanide left on the part. Steel: anodic in sodium hydroxide 52 g/L at 6 V.",
        minutes: 10,
        perPart: false,
        cautionKeys: [
          "acid-cyanide",
          "acid-splash",
          "hot-alkali",
          "power",
          "hexavalent-chromium",
          "embrittlement",
          "sheet",
          "waste",
        ],
        station: null,
      },
      {
        title: "Prove it gone",
        detail:
          "One drop of the hydrochloric strip on a rinsed place: fizz is chromium left, no fizz is nickel. Rinse the drop off. Look in recesses, where old chromium ends.",
        minutes: 3,
        perPart: true,
        cautionKeys: ["acid-splash", "acid-cyanide"],
        station: "inspect",
      },
      clean("Electroclean, cathodic over nickel", {
        detail: "1 min. Old nickel is passive: no anodic end.",
        minutes: 4,
      }),
      nickelStrike({
        detail: "1 to 2 min where nickel was left on; bare steel or brass goes by its own activator instead.",
      }),
      strike({ detail: "Two full rinses first. Tape across the old edge line." }),
    ],
    whenNot:
      "Not zinc or aluminium in caustic or hydrochloric: both dissolve. They go to a shop with the strip for them.",
    materials: ["hydrochloric acid", "sodium hydroxide", "Woods nickel strike"],
    sourceKeys: ["strip-columns", "woods-columns", "common-practice", "from-memory"],
  },
  {
    slug: "bake-and-recheck",
    causeSlugs: ["hydrogen-in-steel"],
    title: "High-strength steel that blistered: hold, bake as the engineer says, test again",
    steps: [
      {
        title: "Hold the lot and name the steel",
        detail:
          "Every part of the run on hold, not only the blistered one. Alloy, strength or hardness, and hours since the strike on the tag: the engineer needs all four.",
        minutes: 5,
        perPart: false,
        cautionKeys: ["embrittlement"],
        station: "inspect",
      },
      {
        title: "Bake by the engineer's order",
        detail:
          "ASTM B850 runs from 8 h at 1001 to 1100 MPa, two hours more a step, to 22 h at 1701 to 1800 MPa, 190 to 220 °C, part temperature. Chart in the job folder.",
        minutes: 20,
        perPart: false,
        cautionKeys: ["embrittlement", "hot-part"],
        station: "finish",
      },
      {
        title: "Look and test after the bake",
        detail:
          "Adhesion counts after the bake (ASTM B571), not before. Loupe for blisters over the whole face, then bend or burnish a spare.",
        minutes: 4,
        perPart: true,
        cautionKeys: ["hot-part"],
        station: "inspect",
      },
      clean("Blistered ones: anodic only, from bare steel", {
        detail: "Copper off by persulfate or wet abrasive, then 2 to 3 min anodic. No cathodic current and no pickle.",
        minutes: 8,
        cautionKeys: ["embrittlement", "persulfate", "polishing-dust"],
      }),
      strike({
        detail:
          "Only with the engineer's leave: shortest dip or none, high-efficiency end of the window, then the bake again within its hours.",
        cautionKeys: ["embrittlement"],
      }),
    ],
    whenNot:
      "Never decided at the line: whether the part goes on, is baked again or is scrapped is the engineer's. Not over tin, zinc or solder, which the heat harms.",
    materials: ["oven with a charted thermometer", "anodic cleaner", "spare for the bend test"],
    sourceKeys: ["astm-b850", "astm-b849", "astm-b571", "from-memory"],
  },
];
