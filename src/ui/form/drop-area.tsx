"use client";
import { type DragEvent, type ReactNode, useState } from "react";
import { classNames } from "../class-names";

/** Dropping is a second way in; the buttons inside are the first. */
export function DropArea({ onTake, children }: { onTake: (files: File[]) => void; children: ReactNode }) {
  const [over, setOver] = useState(false);

  function hover(event: DragEvent) {
    event.preventDefault();
    setOver(true);
  }
  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    onTake([...event.dataTransfer.files]);
  }

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: see above
    <div
      onDragOver={hover}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={classNames(
        "flex flex-wrap items-center gap-2 rounded-control border border-dashed p-3",
        over ? "border-petrol bg-petrol-soft" : "border-edge",
      )}
    >
      {children}
    </div>
  );
}
