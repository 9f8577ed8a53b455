import type { SetDetail } from "@/data/sets";
import { isOpenStage, type Phase } from "@/db/vocabulary";
import type { Clock } from "@/format/calendar";
import { formatInstant } from "@/format/format-date";
import { plural } from "@/format/plural";
import { Sheet } from "@/ui/layout/sheet";
import { PhotoTile } from "./photo-tile";
import { PhotoUpload } from "./photo-upload";
import { photoWords } from "./photo-words";

type Props = {
  set: Pick<SetDetail, "setId" | "stage" | "injectors" | "photos">;
  clock: Clock;
  /** The roles of who looks at it. */
  roles: readonly string[];
  /** What the bench is at, where that is known. */
  phase?: Phase;
};

/** The photos of a set, and the way to take more while it is worked on. */
export function PhotosPanel({ set, clock, roles, phase }: Props) {
  const { photos, injectors } = set;
  const kinds = roles.includes("technician")
    ? (["spray", "intake"] as const)
    : roles.includes("counter")
      ? (["intake"] as const)
      : [];
  const uploads = kinds.length > 0 && isOpenStage(set.stage);
  if (photos.length === 0 && !uploads) return null;
  return (
    <Sheet title="Photos" note={photos.length > 0 ? plural(photos.length, "photo") : "none yet"}>
      {photos.length > 0 ? (
        <ul className="mb-3 flex flex-wrap gap-3">
          {photos.map((photo) => (
            <PhotoTile
              key={photo.photoId}
              photo={photo}
              words={photoWords(photo, injectors)}
              taken={`${formatInstant(photo.takenAt, clock)}, ${photo.takenBy}`}
              mayHide={roles.includes("manager")}
            />
          ))}
        </ul>
      ) : null}
      {uploads ? <PhotoUpload set={set} kinds={kinds} phase={phase} /> : null}
    </Sheet>
  );
}
