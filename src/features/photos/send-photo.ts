import { newKey } from "@/ui/form/new-key";
import type { Upload, Uploaded } from "@/ui/form/upload-item";

/** What a photo shows. */
export type PhotoOf = { setId: string; setInjectorId?: string; kind: "intake" | "spray"; phase?: string };

// A photo that is sent again after a lost answer is the same photo, not a second one.
const keys = new WeakMap<File, string>();

/** Sends one photo, saying how far it is. What the server refuses is thrown as its sentence. */
export function sendPhoto(photo: PhotoOf): Upload {
  return (file, { onProgress, signal }) =>
    new Promise<Uploaded>((resolve, reject) => {
      const request = new XMLHttpRequest();
      request.open("POST", addressOf(photo, file));
      request.setRequestHeader("Content-Type", "application/octet-stream");
      request.setRequestHeader("X-File-Name", encodeURIComponent(file.name));
      request.responseType = "json";
      request.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0);
      request.onerror = () => reject(new Error("The server could not be reached. Please try again."));
      request.onload = () => {
        const { status, response } = request;
        if (status >= 200 && status < 300) resolve(uploadedOf(response.photoId));
        else reject(new Error(sentenceOf(response)));
      };
      signal.addEventListener("abort", () => request.abort());
      request.send(file);
    });
}

function addressOf(photo: PhotoOf, file: File): string {
  const key = keys.get(file) ?? newKey();
  keys.set(file, key);
  const asked = new URLSearchParams({ idempotencyKey: key });
  for (const [name, value] of Object.entries(photo)) if (value) asked.set(name, value);
  return `/api/files/photos?${asked}`;
}

function uploadedOf(photoId: string): Uploaded {
  return { id: photoId, previewUrl: `/api/files/photos/${photoId}?size=thumbnail` };
}

type Problem = { title?: string; fields?: Record<string, string[]>; missing?: string[] } | null;

function sentenceOf(problem: Problem): string {
  const said = Object.values(problem?.fields ?? {}).flat();
  if (said.length > 0) return said.join(" ");
  return [problem?.title ?? "The photo was not taken.", ...(problem?.missing ?? [])].join(" ");
}
