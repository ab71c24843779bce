import { sourceKind, type SourceKind } from "@/lib/costs/strip-basis";

const MARK_CLASSES: Record<SourceKind, string> = {
  published: "src",
  memory: "src src--memory",
  part: "src src--part",
  shop: "src src--shop",
};

interface SourceMarkProps {
  source: string;
  /** Read from the source's own words when it is not given. */
  kind?: SourceKind;
}

/** Where a figure comes from: by shape first, then in words. */
export function SourceMark({ source, kind = sourceKind(source) }: SourceMarkProps) {
  const said = kind === "published" ? `Published: ${source}` : source;
  return (
    <span className={MARK_CLASSES[kind]}>
      <span>{said.charAt(0).toUpperCase() + said.slice(1)}</span>
    </span>
  );
}
