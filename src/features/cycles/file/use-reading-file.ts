"use client";
import { useState } from "react";
import type { ReadingFileFormat } from "../../../data/cycles/inputs";
import { newKey } from "../../../ui/form/new-key";
import type { DraftStore } from "../draft/draft-store";
import { fetchChanges, takeChanges } from "../draft/fetch-changes";
import { type FilePreview, sendFile } from "./send-file";

const unsaved = "What was typed has not reached the server yet. Please try again in a moment.";

/** A file of readings: looked at first, then taken over as a whole. */
export function useReadingFile(store: DraftStore, onTaken: () => void) {
  const [file, setFile] = useState<File | null>(null);
  const [format, setFormat] = useState<ReadingFileFormat>({ separator: ",", decimalMark: "." });
  const [preview, setPreview] = useState<FilePreview | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const { draftId } = store;

  async function look(chosen: File, as: ReadingFileFormat): Promise<void> {
    setFile(chosen);
    setFormat(as);
    setPreview(null);
    await working(async () => {
      if (!(await store.flush())) return setRefusal(unsaved);
      const answer = await sendFile<FilePreview>({ draftId, file: chosen, format: as });
      if ("refusal" in answer) setRefusal(answer.refusal);
      else setPreview(answer.result);
    });
  }

  /** Another way to read the file: the one chosen is looked at again. */
  function readAs(next: ReadingFileFormat): void {
    setFormat(next);
    if (file) void look(file, next);
  }

  async function take(): Promise<void> {
    if (!file || !preview) return;
    await working(async () => {
      const { version } = preview;
      const answer = await sendFile({ draftId, file, format, take: { idempotencyKey: newKey(), version } });
      if ("refusal" in answer) return setRefusal(answer.refusal);
      takeChanges(store, await fetchChanges(store));
      setFile(null);
      setPreview(null);
      onTaken();
    });
  }

  async function working(work: () => Promise<void>): Promise<void> {
    setBusy(true);
    setRefusal(null);
    await work().finally(() => setBusy(false));
  }

  return { file, format, preview, refusal, busy, look, readAs, take };
}
