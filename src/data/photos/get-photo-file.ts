import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { blobs } from "../../db/schema/blobs";
import { photos } from "../../db/schema/photos";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { notFound } from "../access/errors";
import { read } from "../read";
import { setsWithin } from "../sets";
import { getPhotoFileInput } from "./inputs";

/** A photo's bytes. A hidden one is there for the manager alone. */
export function getPhotoFile(context: Context, raw: unknown) {
  return read(context, "getPhotoFile", getPhotoFileInput, raw, async ({ connection, input, grant }) => {
    const seesHidden = requirePerson(context).roles.includes("manager");
    const [file] = await connection
      .select({ bytes: blobs.bytes, mediaType: blobs.mediaType, number: sets.number })
      .from(photos)
      .innerJoin(sets, eq(sets.id, photos.setId))
      .innerJoin(blobs, eq(blobs.sha256, input.size === "full" ? photos.sha256 : photos.thumbnailSha256))
      .where(
        and(
          eq(photos.id, input.photoId),
          setsWithin(grant),
          seesHidden ? undefined : isNull(photos.hiddenAt),
        ),
      );
    if (!file) throw notFound("photo");
    return file;
  });
}
