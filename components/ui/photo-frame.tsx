import type { CSSProperties, ReactNode } from "react";

export interface PhotoFrameProps {
  /** Null shows the words in `missing` instead. */
  src: string | null;
  alt: string;
  srcSet?: string;
  sizes?: string;
  /** A data URL from the thumbhash; shows until the photo is there. */
  placeholder?: string;
  /** Width over height: "4 / 3" (without it), "1", "3 / 2". */
  ratio?: string;
  /** Bottom left. */
  caption?: ReactNode;
  /** The photo was rendered for the demo: it says so. */
  rendered?: boolean;
  /** The first photo of the page: fetched at once. */
  eager?: boolean;
  missing?: string;
  /** Marks, loupe: laid over the photo. */
  children?: ReactNode;
  className?: string;
}

/** A photo in its fixed place, so nothing moves when it arrives. */
export function PhotoFrame(props: PhotoFrameProps) {
  const { src, alt, srcSet, sizes, placeholder, ratio = "4 / 3", caption, rendered, eager, missing, children } = props;
  const frame: CSSProperties = {
    aspectRatio: ratio,
    ...(placeholder && src ? { backgroundImage: `url("${placeholder}")` } : {}),
  };
  return (
    <figure className={props.className ? `shot ${props.className}` : "shot"} style={frame}>
      {src ? (
        <img
          src={src}
          alt={alt}
          srcSet={srcSet}
          sizes={sizes}
          loading={eager ? "eager" : "lazy"}
          fetchPriority={eager ? "high" : "auto"}
          decoding="async"
        />
      ) : (
        <span className="shot__missing">{missing ?? "No photo"}</span>
      )}
      {caption && <figcaption className="shot__cap">{caption}</figcaption>}
      {rendered && src && <span className="shot__demo">Rendered demo photo</span>}
      {children}
    </figure>
  );
}
