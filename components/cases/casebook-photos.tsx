import { PhotoFrame } from "@/components/ui/photo-frame";
import type { CasebookItem } from "@/lib/cases/casebook-item";
import { routes } from "@/lib/routes";

const afterWords = (item: CasebookItem) => (item.state === "closed-sound" ? "After" : "Re-strike");

/** Before and after side by side; where there is no after, the words that say why. */
export function CasebookPhotos({ item, eager }: { item: CasebookItem; eager?: boolean }) {
  const { before, after } = item;
  return (
    <div className="pair cb-pair">
      <PhotoFrame
        src={before && routes.photo(before.id, "thumb")}
        alt={`${item.ref} before`}
        caption={before && "Before"}
        missing="No photo yet"
        eager={eager}
      />
      <PhotoFrame
        src={after && routes.photo(after.id, "thumb")}
        alt={`${item.ref} after the re-strike`}
        caption={after && afterWords(item)}
        missing={item.noAfter}
        eager={eager}
      />
    </div>
  );
}

/** The same, small, for a line of the table. */
export function CasebookThumbs({ item }: { item: CasebookItem }) {
  const shots = [
    { photo: item.before, words: "before" },
    { photo: item.after, words: "after the re-strike" },
  ];
  return (
    <span className="cb-thumbs">
      {shots.map(
        ({ photo, words }) =>
          photo && (
            <span className="shot" key={words}>
              <img
                src={routes.photo(photo.id, "thumb")}
                alt={`${item.ref} ${words}`}
                width={54}
                height={54}
                loading="lazy"
              />
            </span>
          ),
      )}
    </span>
  );
}
