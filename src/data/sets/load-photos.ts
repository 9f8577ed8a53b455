import "server-only";
import { and, asc, eq, isNull } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { people } from "../../db/schema/people";
import { photos } from "../../db/schema/photos";
import type { Grant } from "../access/authorize";
import type { SetPhoto } from "./types";

/** Customers see nothing of a hidden photo. */
export function loadPhotos(connection: Connection, setId: string, grant: Grant): Promise<SetPhoto[]> {
  return connection
    .select({
      photoId: photos.id,
      setInjectorId: photos.setInjectorId,
      kind: photos.kind,
      phase: photos.phase,
      widthPx: photos.widthPx,
      heightPx: photos.heightPx,
      takenAt: photos.takenAt,
      takenBy: people.name,
      hiddenReason: photos.hiddenReason,
    })
    .from(photos)
    .innerJoin(people, eq(people.id, photos.takenBy))
    .where(and(eq(photos.setId, setId), grant.customerIds ? isNull(photos.hiddenAt) : undefined))
    .orderBy(asc(photos.takenAt), asc(photos.id));
}
