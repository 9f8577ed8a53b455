import "server-only";
import { createHash } from "node:crypto";
import sharp from "sharp";
import { invalid, isRefusal, type Refusal } from "../access/errors";
import { fewAtATime } from "./few-at-a-time";
import { requirePictureKind } from "./picture-kind";

export type Picture = {
  full: { sha256: string; bytes: Uint8Array };
  thumbnail: { sha256: string; bytes: Uint8Array };
  widthPx: number;
  heightPx: number;
  /** What the camera says; nobody vouches for it. */
  claimedTakenAt: string | null;
};

const mostPixels = 50_000_000;
const longestSidePx = 4096;
const thumbnailSidePx = 480;

// Every decoder is closed, then the three that are asked for are opened again: sharp would read SVG and others unasked.
sharp.block({ operation: ["VipsForeignLoad"] });
sharp.unblock({
  operation: ["VipsForeignLoadJpegBuffer", "VipsForeignLoadPngBuffer", "VipsForeignLoadWebpBuffer"],
});
sharp.concurrency(1);
sharp.cache(false);

/** A photo as it is kept: upright, as JPEG, without metadata or anything that trailed the picture. */
export async function preparePicture(received: Uint8Array): Promise<Picture> {
  const kind = await requirePictureKind(received);
  return fewAtATime(async () => {
    try {
      const { format, width, height, exif } = await sharp(received, { limitInputPixels: false }).metadata();
      if (format !== kind) throw unreadable();
      if (width * height > mostPixels)
        throw invalid("file", `The photo has ${width} × ${height} pixels; at most 50 megapixels are kept.`);
      return { ...(await reencode(received)), claimedTakenAt: claimedTime(exif) };
    } catch (error) {
      throw isRefusal(error) ? error : unreadable(error);
    }
  });
}

async function reencode(received: Uint8Array) {
  const { data, info } = await sharp(received, { limitInputPixels: mostPixels, failOn: "error" })
    .autoOrient()
    .resize({ width: longestSidePx, height: longestSidePx, fit: "inside", withoutEnlargement: true })
    .flatten({ background: "#ffffff" })
    .toColourspace("srgb")
    .jpeg({ quality: 85 })
    .toBuffer({ resolveWithObject: true });
  const thumbnail = await sharp(data)
    .resize({ width: thumbnailSidePx, height: thumbnailSidePx, fit: "inside", withoutEnlargement: true })
    .jpeg({ quality: 80 })
    .toBuffer();
  return { full: hashed(data), thumbnail: hashed(thumbnail), widthPx: info.width, heightPx: info.height };
}

function hashed(bytes: Uint8Array) {
  return { sha256: createHash("sha256").update(bytes).digest("hex"), bytes };
}

function unreadable(cause?: unknown): Refusal {
  if (cause) console.warn("a photo could not be read", cause instanceof Error ? cause.message : cause);
  return invalid(
    "file",
    "The photo cannot be read; it may have been cut off on its way. Please send it again.",
  );
}

/** EXIF writes times as text, 2026:03:14 09:26:53, whichever field they are in. */
function claimedTime(exif: Buffer | undefined): string | null {
  const found = /(\d{4}):(\d{2}):(\d{2}) (\d{2}:\d{2}:\d{2})/.exec(exif?.toString("latin1") ?? "");
  return found ? `${found[1]}-${found[2]}-${found[3]} ${found[4]}` : null;
}
