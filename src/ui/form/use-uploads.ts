"use client";
import { useEffect, useRef, useState } from "react";
import { formatBytes } from "../../format/format-bytes";
import { newKey } from "./new-key";
import type { Upload, Uploaded, UploadItem } from "./upload-item";

type Options = {
  upload: Upload;
  remove?: (uploaded: Uploaded) => Promise<void>;
  onUploaded?: (uploaded: Uploaded, file: File) => void;
  largestBytes?: number;
  mostFiles?: number;
};

type Waiting = { file: File; abort: AbortController };

/** Files on their way up, two at a time; one that failed stays in the list and can be sent again. */
export function useUploads({ upload, remove, onUploaded, largestBytes, mostFiles }: Options) {
  const [items, setItems] = useState<UploadItem[]>([]);
  const files = useRef(new Map<string, Waiting>());
  const running = useRef(0);
  const queue = useRef<string[]>([]);

  useEffect(() => {
    const kept = files.current;
    return () => {
      for (const { abort } of kept.values()) abort.abort();
    };
  }, []);

  function change(key: string, part: Partial<UploadItem>) {
    setItems((all) => all.map((item) => (item.key === key ? { ...item, ...part } : item)));
  }

  function add(chosen: readonly File[]) {
    const room = mostFiles === undefined ? chosen.length : Math.max(0, mostFiles - items.length);
    const added = chosen.slice(0, room).map((file) => {
      const key = newKey();
      files.current.set(key, { file, abort: new AbortController() });
      return itemOf(key, file, largestBytes);
    });
    setItems((all) => [...all, ...added]);
    queue.current.push(...added.filter(({ state }) => state === "waiting").map(({ key }) => key));
    next();
    return chosen.length - added.length;
  }

  function next() {
    while (running.current < 2 && queue.current.length > 0) void run(queue.current.shift()!);
  }

  async function run(key: string) {
    const waiting = files.current.get(key);
    if (!waiting) return;
    running.current += 1;
    change(key, { state: "uploading", progress: 0, problem: undefined });
    try {
      const onProgress = (progress: number) => change(key, { progress });
      const uploaded = await upload(waiting.file, { onProgress, signal: waiting.abort.signal });
      change(key, { state: "done", progress: 1, uploaded });
      onUploaded?.(uploaded, waiting.file);
    } catch (error) {
      change(key, { state: "failed", problem: problemOf(error) });
    }
    running.current -= 1;
    next();
  }

  function retry(key: string) {
    change(key, { state: "waiting" });
    queue.current.push(key);
    next();
  }

  async function drop(item: UploadItem) {
    files.current.get(item.key)?.abort.abort();
    queue.current = queue.current.filter((key) => key !== item.key);
    if (item.uploaded && remove) {
      try {
        await remove(item.uploaded);
      } catch (error) {
        return change(item.key, { problem: problemOf(error) });
      }
    }
    files.current.delete(item.key);
    if (item.previewUrl) URL.revokeObjectURL(item.previewUrl);
    setItems((all) => all.filter(({ key }) => key !== item.key));
  }

  return { items, add, retry, drop };
}

function itemOf(key: string, file: File, largestBytes?: number): UploadItem {
  const tooLarge = largestBytes !== undefined && file.size > largestBytes;
  return {
    key,
    name: file.name,
    size: file.size,
    previewUrl: file.type.startsWith("image/") ? URL.createObjectURL(file) : null,
    state: tooLarge ? "failed" : "waiting",
    progress: 0,
    problem: tooLarge ? `Larger than ${formatBytes(largestBytes)}.` : undefined,
  };
}

function problemOf(error: unknown): string {
  return error instanceof Error && error.message ? error.message : "The file did not arrive.";
}
