import "server-only";
import { and, eq, isNull } from "drizzle-orm";
import { recordNow } from "../../db/columns";
import { photos } from "../../db/schema/photos";
import type { Context } from "../access/actor";
import { requirePerson } from "../access/authorize";
import { notFound, refused } from "../access/errors";
import { write } from "../write";
import { hidePhotoInput } from "./inputs";

/** Takes a photo out of sight, with the reason; its row and file stay. */
export function hidePhoto(context: Context, raw: unknown) {
  return write(context, "hidePhoto", hidePhotoInput, raw, async ({ transaction, input, record }) => {
    const { photoId, reason } = input;
    const [photo] = await transaction
      .select({ setId: photos.setId })
      .from(photos)
      .where(eq(photos.id, photoId));
    if (!photo) throw notFound("photo");
    const hidden = await transaction
      .update(photos)
      .set({ hiddenBy: requirePerson(context).personId, hiddenAt: recordNow, hiddenReason: reason })
      .where(and(eq(photos.id, photoId), isNull(photos.hiddenAt)))
      .returning({ id: photos.id });
    if (hidden.length === 0) throw refused("The photo is hidden already.");
    await record({ event: "photo hidden", noun: "photo", objectId: photoId, setId: photo.setId, reason });
    return { setId: photo.setId };
  });
}
