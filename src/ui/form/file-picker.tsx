"use client";
import { Camera, Upload as UploadIcon } from "lucide-react";
import { type ReactNode, useId, useState } from "react";
import { DropArea } from "./drop-area";
import { FieldMessage } from "./field-message";
import { FileChooser } from "./file-chooser";
import { FileList } from "./file-list";
import type { Upload, Uploaded } from "./upload-item";
import { useUploads } from "./use-uploads";

type Props = {
  label: ReactNode;
  hint?: ReactNode;
  /** Sends one file. What it throws is shown beside the file. */
  upload: Upload;
  /** Takes back one that has arrived; without it only files still on their way can be removed. */
  remove?: (uploaded: Uploaded) => Promise<void>;
  onUploaded?: (uploaded: Uploaded, file: File) => void;
  accept?: string;
  multiple?: boolean;
  /** Offers the camera on devices that have one. */
  camera?: boolean;
  largestBytes?: number;
  mostFiles?: number;
  /** Ids of what has arrived go along with the form under this name. */
  name?: string;
};

/** Files that are sent at once, each with its progress. */
export function FilePicker(props: Props) {
  const { label, hint, accept, multiple = true, camera = false, name, remove, mostFiles } = props;
  const { items, add, retry, drop } = useUploads(props);
  const [leftOut, setLeftOut] = useState(0);
  const messageId = useId();

  function take(files: File[]) {
    if (files.length > 0) setLeftOut(add(multiple ? files : files.slice(0, 1)));
  }

  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 text-small font-medium">{label}</legend>
      <DropArea onTake={take}>
        <FileChooser accept={accept} multiple={multiple} describedBy={messageId} onTake={take}>
          <UploadIcon aria-hidden="true" size={15} />
          {multiple ? "Choose files" : "Choose a file"}
        </FileChooser>
        {camera ? (
          <FileChooser accept="image/*" capture onTake={take} className="not-pointer-coarse:hidden">
            <Camera aria-hidden="true" size={15} />
            Take a photo
          </FileChooser>
        ) : null}
        <span className="text-small text-ink-2 pointer-coarse:hidden">
          {multiple ? "or drop them here" : "or drop it here"}
        </span>
      </DropArea>
      <FieldMessage
        id={messageId}
        hint={hint}
        errors={leftOut > 0 ? [`${leftOut} left out: at most ${mostFiles} files.`] : undefined}
      />
      <FileList items={items} onRetry={retry} onRemove={drop} removable={Boolean(remove)} />
      {name
        ? items.map(({ uploaded }) =>
            uploaded ? (
              <input key={uploaded.id} type="hidden" name={name} value={uploaded.id} readOnly />
            ) : null,
          )
        : null}
    </fieldset>
  );
}
