import { placeholderUrl } from "@/components/photos/placeholder-url";
import { PhotoFrame } from "@/components/ui/photo-frame";
import type { CasePhoto } from "@/db/queries/photos";
import type { ReworkCard } from "@/db/queries/rework";
import { dayAndTime } from "@/lib/cases/shop-clock";
import { routes } from "@/lib/routes";

interface RoundPhotosProps {
  card: Pick<ReworkCard, "round" | "openedAt" | "doneAt">;
  photos: CasePhoto[];
  timeZone: string;
}

/** The part as this round began: as it was held, or as the re-strike before left it. */
export function BeforePhoto({ card, photos, timeZone }: RoundPhotosProps) {
  const restruck = photos.find((photo) => photo.purpose === "re-strike" && photo.round === card.round - 1);
  const photo = restruck ?? photos.find((each) => each.purpose === "suspect");
  if (!photo) return null;
  const caption = restruck ? `Re-strike, round ${card.round - 1}` : `Held, ${dayAndTime(card.openedAt, timeZone)}`;
  return <Frame photo={photo} caption={caption} alt="The part before this round" />;
}

/** Before and after, edge to edge. */
export function RoundPhotos(props: RoundPhotosProps) {
  const { card, photos, timeZone } = props;
  const after = photos.find((photo) => photo.purpose === "re-strike" && photo.round === card.round);
  return (
    <div className="pair">
      <BeforePhoto {...props} />
      {after && card.doneAt !== null && (
        <Frame
          photo={after}
          caption={`Re-strike, ${dayAndTime(card.doneAt, timeZone)}`}
          alt="The part after the re-strike"
        />
      )}
    </div>
  );
}

function Frame({ photo, caption, alt }: { photo: CasePhoto; caption: string; alt: string }) {
  return (
    <PhotoFrame
      src={photo.state === "ready" ? routes.photo(photo.id, "view") : null}
      placeholder={photo.placeholder ? placeholderUrl(photo.placeholder) : undefined}
      alt={alt}
      ratio="1"
      caption={caption}
      rendered={photo.isRendered}
      eager
      missing={photo.refusal ?? "The photo is on its way"}
    />
  );
}
