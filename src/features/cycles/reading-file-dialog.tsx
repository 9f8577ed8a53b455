"use client";
import { Dialog } from "radix-ui";
import { useState } from "react";
import type { CycleDraft } from "../../data/cycles";
import { buttonStyle } from "../../ui/button-style";
import { Notice } from "../../ui/feedback/notice";
import { Button } from "../../ui/form/button";
import { FileChooser } from "../../ui/form/file-chooser";
import { Select } from "../../ui/form/select";
import { dialogStyle, overlayStyle } from "../../ui/layout/dialog-style";
import type { DraftStore } from "./draft/draft-store";
import { FileFormatHelp } from "./file/file-format-help";
import { FilePreviewTable } from "./file/file-preview-table";
import { useReadingFile } from "./file/use-reading-file";

type Props = { draft: CycleDraft; store: DraftStore };

/** Readings as a file: what it would change is shown before anything is. */
export function ReadingFileDialog({ draft, store }: Props) {
  const [open, setOpen] = useState(false);
  const { file, format, preview, refusal, busy, look, readAs, take } = useReadingFile(store, () =>
    setOpen(false),
  );
  const ready = preview !== null && preview.problems.length === 0 && preview.changes.length > 0;

  return (
    <Dialog.Root open={open} onOpenChange={setOpen}>
      <Dialog.Trigger className={buttonStyle("plain")}>Readings from a file</Dialog.Trigger>
      <Dialog.Portal>
        <Dialog.Overlay className={overlayStyle} />
        <Dialog.Content className={dialogStyle} aria-describedby={undefined}>
          <Dialog.Title className="text-large font-semibold">
            Readings of set {draft.set.number} from a file
          </Dialog.Title>
          <FileFormatHelp tag={draft.injectors[0]?.tag ?? ""} />
          <div className="mt-3 grid grid-cols-2 gap-x-3">
            <Select
              label="Columns are separated by"
              value={format.separator}
              options={[
                { value: ",", label: "comma ," },
                { value: ";", label: "semicolon ;" },
              ]}
              onChange={({ target }) => readAs({ ...format, separator: target.value as "," | ";" })}
            />
            <Select
              label="Decimals are written with a"
              value={format.decimalMark}
              options={[
                { value: ".", label: "point 12.5" },
                { value: ",", label: "comma 12,5" },
              ]}
              onChange={({ target }) => readAs({ ...format, decimalMark: target.value as "." | "," })}
            />
          </div>
          <FileChooser
            accept=".csv,text/csv,text/plain"
            onTake={([chosen]) => chosen && void look(chosen, format)}
          >
            {file ? `Another file instead of ${file.name}` : "Choose a file"}
          </FileChooser>
          {refusal ? (
            <Notice kind="refusal" live className="mt-3">
              {refusal}
            </Notice>
          ) : null}
          {preview ? (
            <FilePreviewTable
              preview={preview}
              fields={store.snapshot().fields}
              injectors={draft.injectors}
            />
          ) : null}
          <div className="mt-4 flex flex-wrap justify-end gap-2">
            <Dialog.Close className={buttonStyle("plain")}>Cancel</Dialog.Close>
            <Button kind="primary" disabled={!ready || busy} onClick={() => void take()}>
              {busy ? "Working" : "Put on the sheet"}
            </Button>
          </div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  );
}
