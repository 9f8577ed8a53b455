import "server-only";
import { and, count, eq, gte, sql } from "drizzle-orm";
import type { z } from "zod";
import type { Transaction } from "../../db/client";
import { recordNow } from "../../db/columns";
import { blobs } from "../../db/schema/blobs";
import { setInjectors } from "../../db/schema/injectors";
import { labDetails } from "../../db/schema/lab";
import { photos } from "../../db/schema/photos";
import type { Context } from "../access/actor";
import { authorize, requirePerson } from "../access/authorize";
import { forbidden, invalid, refused } from "../access/errors";
import { recordDenial } from "../audit/record-denial";
import { lockSet, requireOpenStage } from "../course";
import { writeInput } from "../fields";
import { parseInput } from "../parse-input";
import { fileLabel, receivedBytes } from "../received-bytes";
import { write } from "../write";
import { mostPhotosPerDay, mostPhotosPerSet, photoFields } from "./inputs";
import { type Picture, preparePicture } from "./prepare-picture";

const addPhotoInput = writeInput({ ...photoFields, file: receivedBytes("The photo is missing.") });
type Input = z.output<typeof addPhotoInput>;

/** Keeps a photo of a set: upright, without its metadata, beside the hash of what came in. */
export async function addPhoto(context: Context, raw: unknown): Promise<{ photoId: string }> {
  await authorize(context, "addPhoto");
  const asked = parseInput(addPhotoInput, raw);
  await requireOwnKind(context, asked);
  // Decoding takes a while and needs no lock, so it is done before the transaction.
  const picture = await preparePicture(asked.file.bytes);
  return write(context, "addPhoto", addPhotoInput, raw, async ({ transaction, input, record }) => {
    requireOpenStage(await lockSet(transaction, input.setId));
    await requireInjectorOfSet(transaction, input);
    await requireRoom(transaction, context, input.setId);
    const photoId = await insertPhoto(transaction, context, input, picture);
    await record({
      event: "photo added",
      noun: "photo",
      objectId: photoId,
      setId: input.setId,
      after: {
        kind: input.kind,
        phase: input.phase ?? null,
        setInjectorId: input.setInjectorId ?? null,
        sha256: picture.full.sha256,
        receivedSha256: input.file.sha256,
      },
    });
    return { photoId };
  });
}

/** The counter photographs what came in; spray is photographed at the bench. */
async function requireOwnKind(context: Context, { kind, phase, setInjectorId }: Input): Promise<void> {
  if (kind !== "spray") return;
  if (!requirePerson(context).roles.includes("technician")) {
    await recordDenial(context, "addPhoto");
    throw forbidden();
  }
  if (!setInjectorId) throw invalid("setInjectorId", "A spray photo shows one injector: please choose it.");
  if (!phase) throw invalid("phase", "A spray photo is as found or as left: please choose one.");
}

async function requireInjectorOfSet(transaction: Transaction, input: Input): Promise<void> {
  if (!input.setInjectorId) return;
  const [found] = await transaction
    .select({ id: setInjectors.id })
    .from(setInjectors)
    .where(and(eq(setInjectors.id, input.setInjectorId), eq(setInjectors.setId, input.setId)));
  if (!found) throw invalid("setInjectorId", "The injector is not in this set.");
}

/** The set's row is locked, and the person's own count is under a lock of its own: no race goes over the limits. */
async function requireRoom(transaction: Transaction, context: Context, setId: string): Promise<void> {
  const { personId } = requirePerson(context);
  const [ofSet] = await transaction.select({ photos: count() }).from(photos).where(eq(photos.setId, setId));
  if (ofSet!.photos >= mostPhotosPerSet) throw refused(`A set has at most ${mostPhotosPerSet} photos.`);
  await transaction.execute(sql`select pg_advisory_xact_lock(hashtext(${`photos of ${personId}`}))`);
  const startOfDay = sql`(date_trunc('day', record_now() at time zone ${labDetails.timeZone}) at time zone ${labDetails.timeZone})`;
  const [today] = await transaction
    .select({ photos: count() })
    .from(photos)
    .innerJoin(labDetails, eq(labDetails.id, 1))
    .where(and(eq(photos.takenBy, personId), gte(photos.takenAt, startOfDay)));
  if (today!.photos >= mostPhotosPerDay)
    throw refused(`One person adds at most ${mostPhotosPerDay} photos a day.`);
}

async function insertPhoto(transaction: Transaction, context: Context, input: Input, picture: Picture) {
  await transaction
    .insert(blobs)
    .values(
      [picture.full, picture.thumbnail].map(({ sha256, bytes }) => ({
        sha256,
        bytes,
        sizeBytes: bytes.length,
        mediaType: "image/jpeg",
      })),
    )
    .onConflictDoNothing();
  const [photo] = await transaction
    .insert(photos)
    .values({
      setId: input.setId,
      setInjectorId: input.setInjectorId ?? null,
      kind: input.kind,
      phase: input.kind === "spray" ? input.phase! : null,
      sha256: picture.full.sha256,
      thumbnailSha256: picture.thumbnail.sha256,
      widthPx: picture.widthPx,
      heightPx: picture.heightPx,
      receivedSha256: input.file.sha256,
      receivedBytes: input.file.bytes.length,
      receivedName: fileLabel(input.name, "photo"),
      claimedTakenAt: picture.claimedTakenAt,
      takenBy: requirePerson(context).personId,
      takenAt: recordNow,
    })
    .returning({ id: photos.id });
  return photo!.id;
}
