import { Glyph } from "@/components/ui/glyph";
import { sittingWords, type Sitting, type SittingPhoto } from "@/lib/practice/sitting";

const GLYPHS = { right: "ui-tick", missed: "ui-cross", open: null } as const;

function Hook({ photo }: { photo: SittingPhoto }) {
  const glyph = GLYPHS[photo.result];
  const name = [`is-${photo.result}`, photo.isNow && "is-now"].filter(Boolean).join(" ");
  return (
    <li className={name}>
      <span>{glyph && <Glyph name={glyph} size={14} />}</span>
    </li>
  );
}

/** Where one is in a sitting: "Photo 6 of 10" and the rack with a hook for each photo. The words say all of it. */
export function SittingHead({ sitting, title }: { sitting: Sitting; title?: string }) {
  const words = sittingWords(sitting);
  return (
    <div className="sitting">
      <p className="sitting__words">
        <b>{`Photo ${sitting.place} of ${sitting.photos.length}`}</b>
        <span>{[title, words].filter(Boolean).join(". ")}</span>
      </p>
      <ol className="sitting__rack" aria-hidden="true">
        {sitting.photos.map((photo, place) => (
          <Hook key={place} photo={photo} />
        ))}
      </ol>
    </div>
  );
}
