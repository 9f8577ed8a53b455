export type Uploaded = { id: string; previewUrl?: string };

export type UploadItem = {
  key: string;
  name: string;
  size: number;
  /** A picture shown beside the name; made here until the server has one. */
  previewUrl: string | null;
  state: "waiting" | "uploading" | "done" | "failed";
  /** 0 to 1. */
  progress: number;
  problem?: string;
  uploaded?: Uploaded;
};

export type Upload = (
  file: File,
  options: { onProgress: (fraction: number) => void; signal: AbortSignal },
) => Promise<Uploaded>;
