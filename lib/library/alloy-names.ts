/**
 * What a job card calls each base metal: alloy numbers and trade names, so that a search by alloy finds the causes
 * that put that metal at risk. Numbers: UNS, AISI and ASTM designations, from memory; zinc names after ASTM B86.
 */
import type { BaseMetal } from "@/lib/cases/case-words";

export const ALLOY_NAMES: Record<BaseMetal, readonly string[]> = {
  steel: ["1008", "1018", "1045", "1095", "1215", "12L14", "4130", "4140", "4340", "8620", "A36", "O1", "A2", "D2", "spring steel", "tool steel", "carbon steel", "mild steel"],
  stainless: ["301", "302", "303", "304", "304L", "316", "316L", "17-4", "17-4PH", "410", "416", "420", "430", "440C", "SS", "inox"],
  iron: ["grey iron", "ductile iron", "malleable iron", "cast iron"],
  brass: ["C220", "C230", "C260", "C272", "C353", "C360", "C385", "C464", "C26000", "C36000", "cartridge brass", "yellow brass", "red brass", "leaded brass", "naval brass"],
  bronze: ["C510", "C544", "C630", "C655", "C905", "C932", "C954", "C51000", "phosphor bronze", "aluminium bronze", "bearing bronze", "gunmetal"],
  copper: ["C101", "C102", "C110", "C122", "C145", "C172", "C11000", "C17200", "OFHC", "ETP", "tellurium copper", "beryllium copper", "BeCu"],
  "nickel-silver": ["C752", "C757", "C770", "C75200", "german silver", "alpaca", "maillechort"],
  nickel: ["Ni200", "alloy 400", "Monel", "Inconel", "Kovar", "Invar", "electroless nickel", "old nickel plate"],
  zinc: ["zamak", "zamac", "zamak 3", "zamak 5", "zamak 7", "Alloy 3", "Alloy 5", "AG40A", "AC41A", "Z33520", "ZA-8", "ZA-12", "pot metal", "white metal", "die cast", "spelter", "mazak"],
  aluminium: ["aluminum", "6061", "6063", "2024", "7075", "5052", "3003", "1100", "A356", "A360", "A380", "ADC12", "alu"],
  silver: ["sterling", "925", "fine silver", "999", "coin silver", "argentium"],
  gold: ["10k", "14k", "18k", "karat", "white gold", "rose gold"],
  pewter: ["britannia", "tin alloy", "lead-free pewter", "white metal casting"],
  other: ["titanium", "magnesium", "lead", "tungsten", "unknown metal"],
};
