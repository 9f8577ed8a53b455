"use client";
import { EyeOff } from "lucide-react";
import { hidePhotoInput } from "@/data/photos/inputs";
import type { SetPhoto } from "@/data/sets";
import { ReasonDialog } from "@/ui/form/reason-dialog";
import { hidePhotoAction } from "./actions";
import { PhotoView } from "./photo-view";

type Props = {
  photo: SetPhoto;
  /** What it shows. */
  words: string;
  /** Who and when. */
  taken: string;
  /** For the manager, who alone hides photos and still sees hidden ones. */
  mayHide: boolean;
};

export function PhotoTile({ photo, words, taken, mayHide }: Props) {
  const { photoId, hiddenReason } = photo;
  return (
    <li className="flex w-[calc(50%-0.375rem)] flex-col gap-1 tablet:w-40">
      {hiddenReason !== null && !mayHide ? (
        <span className="flex h-28 items-center justify-center rounded-mark border border-hair-2 text-ink-2">
          <EyeOff aria-hidden="true" size={20} />
        </span>
      ) : (
        <PhotoView photoId={photoId} words={words} taken={taken} dimmed={hiddenReason !== null} />
      )}
      <p className="text-small font-medium">{words}</p>
      <p className="text-key text-ink-2">{taken}</p>
      {hiddenReason !== null ? <p className="text-key text-held">hidden: {hiddenReason}</p> : null}
      {mayHide && hiddenReason === null ? (
        <ReasonDialog
          trigger="Hide"
          triggerKind="quiet"
          triggerSize="small"
          title={`Hide the photo of ${words}`}
          description="It stays on record with its reason; nobody but the manager opens it any more."
          action={hidePhotoAction}
          schema={hidePhotoInput}
          fields={{ photoId }}
          submitLabel="Hide the photo"
        />
      ) : null}
    </li>
  );
}
