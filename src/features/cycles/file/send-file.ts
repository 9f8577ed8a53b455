import type { ReadingFileFormat } from "../../../data/cycles/inputs";
import type { DraftChange } from "../../../data/cycles/sheet/merge-changes";

export type FileProblem = { line: number; column: string | null; message: string };
export type FilePreview = { version: number; rows: number; problems: FileProblem[]; changes: DraftChange[] };
export type FileAnswer<Result> = { result: Result } | { refusal: string };

type Sending = {
  draftId: string;
  file: File;
  format: ReadingFileFormat;
  /** With these the file is taken over, without them it is looked at. */
  take?: { idempotencyKey: string; version: number };
};

/** Sends a file of readings as the request's body; the answer is what it would do, or that it was done. */
export async function sendFile<Result>({
  draftId,
  file,
  format,
  take,
}: Sending): Promise<FileAnswer<Result>> {
  const asked = new URLSearchParams({ draftId, ...format });
  for (const [name, value] of Object.entries(take ?? {})) asked.set(name, String(value));
  try {
    const response = await fetch(`/api/files/reading-files?${asked}`, {
      method: "POST",
      headers: { "Content-Type": "text/csv", "X-File-Name": encodeURIComponent(file.name) },
      body: file,
    });
    const answer = (await response.json()) as Result & { title?: string };
    return response.ok ? { result: answer } : { refusal: answer.title ?? "The server refused the file." };
  } catch {
    return { refusal: "The server could not be reached. Nothing was changed; please try again." };
  }
}
