import "server-only";
import { and, eq, inArray, type SQL, sql } from "drizzle-orm";
import type { Connection, Transaction } from "../../db/client";
import { blobs } from "../../db/schema/blobs";
import { certificates } from "../../db/schema/certificates";
import { sets } from "../../db/schema/sets";
import type { Grant } from "../access/authorize";
import { notFound } from "../access/errors";

/** The certificates that the actor reaches: all, or those on sets of the customers acted for. */
export function reachableBy(grant: Grant): SQL | undefined {
  return grant.customerIds ? inArray(sets.customerId, [...grant.customerIds]) : undefined;
}

export async function requireCertificate(connection: Connection, certificateId: string, grant: Grant) {
  const [found] = await connection
    .select({ certificate: certificates, setNumber: sets.number, pdfBytes: blobs.sizeBytes })
    .from(certificates)
    .innerJoin(sets, eq(sets.id, certificates.setId))
    .innerJoin(blobs, eq(blobs.sha256, certificates.pdfSha256))
    .where(and(eq(certificates.id, certificateId), reachableBy(grant)));
  if (!found) throw notFound("certificate");
  return { ...found.certificate, setNumber: found.setNumber, pdfBytes: found.pdfBytes };
}

/** For a change of state: the set's row first, as every write on a set does, so that two cannot wait for each other. */
export async function requireCertificateForUpdate(transaction: Transaction, certificateId: string) {
  const [named] = await transaction
    .select({ setId: certificates.setId })
    .from(certificates)
    .where(eq(certificates.id, certificateId));
  if (!named) throw notFound("certificate");
  await transaction.select({ id: sets.id }).from(sets).where(eq(sets.id, named.setId)).for("update");
  const [stored] = await transaction
    .select()
    .from(certificates)
    .where(eq(certificates.id, certificateId))
    .for("update");
  return stored!;
}

/** Replaced by which; null when it is the newest of its series. */
export const replacedByNumber = sql<string | null>`(
  select later.number from certificates later where later.replaces_id = ${certificates.id}
)`;
