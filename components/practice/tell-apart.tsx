import { classGlyph } from "@/components/cases/class-glyph";
import { Glyph } from "@/components/ui/glyph";
import { PhotoFrame } from "@/components/ui/photo-frame";

export interface TellPhoto {
  src: string;
  caption: string;
  isRendered: boolean;
  placeholder?: string;
}

export interface Tell {
  slug: string;
  title: string;
  words: string;
}

/** This photo beside the look-alike at its clearest, and what tells the two apart. */
export function TellApart({ pair, tells }: { pair: readonly TellPhoto[]; tells: readonly Tell[] }) {
  return (
    <div className="tell-apart">
      {pair.length > 1 && (
        <div className="pair">
          {pair.map((photo) => (
            <PhotoFrame
              key={photo.src}
              ratio="1"
              src={photo.src}
              alt={photo.caption}
              caption={photo.caption}
              placeholder={photo.placeholder}
              rendered={photo.isRendered}
            />
          ))}
        </div>
      )}
      <ul className="tell-apart__tells">
        {tells.map((tell) => (
          <li key={`${tell.slug} ${tell.words}`}>
            <Glyph name={classGlyph(tell.slug)} size={26} />
            <span>
              <b>{tell.title}. </b>
              {tell.words}
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}
