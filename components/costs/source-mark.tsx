import { sourceKind, type SourceKind } from "@/lib/costs/strip-basis";

const MARK_CLASSES: Record<SourceKind, string> = {
  published: "src",
  memory: "src src--memory",
  part: "src src--part",
  shop: "src src--shop",
};
const MARK_WORDS: Record<SourceKind, string> = {
  published: "Published: ",
  memory: "",
  part: "Part from memory: ",
  shop: "",
};

interface SourceMarkProps {
  source: string;
  /** Read from the source's own words when it is not given. */
  kind?: SourceKind;
}

/** Where a figure comes from: by shape first, then in words. */
export function SourceMark({ source, kind = sourceKind(source) }: SourceMarkProps) {
  const words = source.replace(/[;,]? ?(?<!shop )from memory$/, (end) => (kind === "part" ? "" : end));
  const said = `${MARK_WORDS[kind]}${words}`;
  return (
    <span className={MARK_CLASSES[kind]}>
      <span>{said.charAt(0).toUpperCase() + said.slice(1)}</span>
    </span>
  );
}
