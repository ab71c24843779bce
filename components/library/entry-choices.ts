import type { StationKind } from "@/lib/cases/case-words";
import type { CautionLevel, SourceKind } from "@/lib/library/library-entry";

/** What an entry may point at, as the form offers it. */
export interface EntryChoices {
  classes: readonly { slug: string; title: string }[];
  /** `of`: the class that the cause shows as most. */
  causes: readonly { slug: string; title: string; of: string }[];
  cautions: readonly { key: string; level: CautionLevel; text: string }[];
  sources: readonly { key: string; kind: SourceKind; citation: string }[];
  /** The shop's own name for each kind of station. */
  stations: readonly { kind: StationKind; name: string }[];
}

/** One field's error by its name in the form, with the names that a schema gives to what stands inside it. */
export type FieldErrors = Readonly<Record<string, string>>;

/** The error of a field or of anything inside it: "steps.0.minutes" for itself, "checks.2" for the field "checks". */
export function errorOf(errors: FieldErrors, name: string): string | undefined {
  return errors[name] ?? Object.entries(errors).find(([path]) => path.startsWith(`${name}.`))?.[1];
}

/** A form's single value by name. */
export const one = (values: Readonly<Record<string, string | readonly string[]>>, name: string): string => {
  const value = values[name];
  return typeof value === "string" ? value : (value?.[0] ?? "");
};

/** A form's list by name. */
export const many = (values: Readonly<Record<string, string | readonly string[]>>, name: string): readonly string[] => {
  const value = values[name];
  return typeof value === "string" ? [value] : (value ?? []);
};
