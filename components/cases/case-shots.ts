import { placeholderUrl } from "@/components/photos/placeholder-url";
import type { StagePhoto } from "@/components/photos/photo-stage";
import { shotCaption, shotMissing, type ShotStanding } from "@/lib/photos/shot-words";

/** A photo of a case as its row has it. */
export interface Shot extends Omit<ShotStanding, "number"> {
  id: string;
  placeholder: string | null;
  isRendered: boolean;
}

/** The photos of a case for the stage, numbered as they were taken. */
export function stagePhotos(caseRef: string, shots: readonly Shot[]): StagePhoto[] {
  return shots.map((shot, index) => {
    const caption = shotCaption(shot);
    return {
      id: shot.id,
      caption,
      alt: `Photo ${index + 1} of ${caseRef}: ${caption.toLowerCase()}`,
      placeholder: placeholderUrl(shot.placeholder),
      isRendered: shot.isRendered,
      missing: shotMissing({ ...shot, number: index + 1 }),
    };
  });
}
