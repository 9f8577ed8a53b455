import "server-only";
import { and, desc, eq, isNull, sql } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { blobs } from "../../db/schema/blobs";
import { customers } from "../../db/schema/customers";
import { labDetails } from "../../db/schema/lab";
import { photos } from "../../db/schema/photos";
import type { Phase } from "../../db/vocabulary";

export type CertificateBasis = Awaited<ReturnType<typeof loadBasis>>;

/** What a certificate says besides the set and its results: the lab, the customer's address, spray photos, the record. */
export async function loadBasis(
  transaction: Transaction,
  { setId, customerId }: { setId: string; customerId: string },
) {
  const [lab] = await transaction.select().from(labDetails);
  const [customer] = await transaction
    .select({ name: customers.name, contactName: customers.contactName, address: customers.address })
    .from(customers)
    .where(eq(customers.id, customerId));
  const [record] = await transaction.execute<{ hash: string; now: string }>(
    sql`select hash, record_now() as now from activity_head`,
  );
  return {
    lab: lab!,
    customer: customer!,
    sprayPhotos: await loadSprayPhotos(transaction, setId),
    recordSha256: record!.hash,
    issuedAt: new Date(record!.now),
  };
}

export type SprayPhoto = {
  sha256: string;
  setInjectorId: string;
  phase: Phase;
  takenAt: Date;
  bytes: Uint8Array;
};

/** The last spray photo of each injector in each phase. The small copy goes to print: a set may hold a hundred of them. */
async function loadSprayPhotos(transaction: Transaction, setId: string): Promise<SprayPhoto[]> {
  const rows = await transaction
    .selectDistinctOn([photos.setInjectorId, photos.phase], {
      sha256: photos.sha256,
      setInjectorId: photos.setInjectorId,
      phase: photos.phase,
      takenAt: photos.takenAt,
      bytes: blobs.bytes,
    })
    .from(photos)
    .innerJoin(blobs, eq(blobs.sha256, photos.thumbnailSha256))
    .where(and(eq(photos.setId, setId), eq(photos.kind, "spray"), isNull(photos.hiddenAt)))
    .orderBy(photos.setInjectorId, photos.phase, desc(photos.takenAt), desc(photos.id));
  return rows.flatMap(({ setInjectorId, phase, ...photo }) =>
    setInjectorId && phase ? [{ ...photo, setInjectorId, phase }] : [],
  );
}
