"use client";
import { X } from "lucide-react";
import { Dialog } from "radix-ui";
import { buttonStyle } from "@/ui/button-style";
import { classNames } from "@/ui/class-names";
import { overlayStyle } from "@/ui/layout/dialog-style";

type Props = { photoId: string; words: string; taken: string; dimmed?: boolean };

/** A small picture that opens large over the page. */
export function PhotoView({ photoId, words, taken, dimmed = false }: Props) {
  return (
    <Dialog.Root>
      <Dialog.Trigger className="overflow-hidden rounded-mark border border-hair bg-hair-2">
        {/* biome-ignore lint/performance/noImgElement: private pictures go through no public picture service */}
        <img
          src={`/api/files/photos/${photoId}?size=thumbnail`}
          alt={`${words}, open large`}
          loading="lazy"
          className={classNames("h-28 w-full object-cover", dimmed && "opacity-40")}
        />
      </Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className={overlayStyle} />
        <Dialog.Content
          aria-describedby={undefined}
          className="fixed inset-4 z-50 flex flex-col gap-2 rounded-dialog border border-hair bg-sheet p-3 shadow-float"
        >
          <div className="flex items-start justify-between gap-3">
            <div>
              <Dialog.Title className="text-heading font-semibold">{words}</Dialog.Title>
              <p className="text-small text-ink-2">{taken}</p>
            </div>
            <Dialog.Close className={buttonStyle("quiet", "small")}>
              <X aria-hidden="true" size={16} />
              Close
            </Dialog.Close>
          </div>
          {/* biome-ignore lint/performance/noImgElement: as above */}
          <img
            src={`/api/files/photos/${photoId}`}
            alt={words}
            className="min-h-0 w-full flex-1 object-contain"
          />
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
