/** Tags that are on their way: blank bars on manila, and the words for readers. */
export function LoadingTags({ count = 3, words = "Fetching the tags" }: { count?: number; words?: string }) {
  return (
    <div className="wire" role="status">
      <span className="sr-only">{words}</span>
      {Array.from({ length: count }, (_, index) => (
        <LoadingTag key={index} />
      ))}
    </div>
  );
}

/** One tag with blank bars. Decorative: say in words what is awaited. */
export function LoadingTag() {
  return (
    <div className="tag tag--blank" aria-hidden="true">
      <span className="tag__paper">
        <span className="tag__top">
          <span className="skel w-28 h-3.5" />
          <span className="skel w-16 h-3.5" />
        </span>
        <span className="tag__cls">
          <span className="skel size-6 rounded-full" />
          <span className="skel w-36 h-5" />
        </span>
        <span className="tag__meta">
          <span className="skel mt-1 w-44 h-3" />
        </span>
      </span>
    </div>
  );
}
