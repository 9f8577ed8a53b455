import "server-only";
import { and, eq, exists, inArray, sql } from "drizzle-orm";
import type { Connection } from "../../db/client";
import { certificates } from "../../db/schema/certificates";
import { sets } from "../../db/schema/sets";
import type { Context } from "../access/actor";
import type { Grant } from "../access/authorize";
import { notFound } from "../access/errors";
import { loadCleaningRuns } from "../cleaning-runs";
import { read } from "../read";
import { getSetResultsInput } from "./inputs";
import { loadPlaced } from "./load-placed";
import { loadReadingFiles } from "./load-reading-files";
import { loadRevisions } from "./load-revisions";
import { loadSetBasis } from "./load-set-basis";
import { phaseResultsOf } from "./phase-results";
import { repeatedCyclesOf } from "./repeated-cycles";
import type { SetResults } from "./results";

/** Everything measured on a set, with its figures; a customer's own sets once they are certified. */
export function getSetResults(context: Context, raw: unknown): Promise<SetResults> {
  return read(context, "getSetResults", getSetResultsInput, raw, async ({ connection, input, grant }) => {
    const { setId } = input;
    await requireReachable(connection, setId, grant);
    const [basisOf, revisions, placed, cleaningRuns, readingFiles] = await Promise.all([
      loadSetBasis(connection, [setId]),
      loadRevisions(connection, [setId]),
      loadPlaced(connection, setId),
      loadCleaningRuns(connection, setId),
      loadReadingFiles(connection, setId),
    ]);
    const basis = basisOf.get(setId)!;
    const leakageLimitMm3PerMin = Math.min(
      basis.model.leakageLimitMm3PerMin,
      basis.toleranceClass.leakageLimitMm3PerMin ?? Number.POSITIVE_INFINITY,
    );
    const beside = { basis, placed, leakageLimitMm3PerMin };
    const asFound = phaseResultsOf("as found", revisions, { ...beside, before: null });
    const asLeft = phaseResultsOf("as left", revisions, { ...beside, before: asFound });
    return {
      setId,
      reference: basis.reference,
      toleranceClass: basis.toleranceClass,
      leakageLimitMm3PerMin,
      asFound,
      asLeft,
      repeatedCycles: repeatedCyclesOf(revisions),
      cleaningRuns,
      readingFiles: readingFiles.map(({ draftId: _draft, ...file }) => file),
    };
  });
}

async function requireReachable(connection: Connection, setId: string, grant: Grant): Promise<void> {
  const certified = exists(
    connection.select({ one: sql`1` }).from(certificates).where(eq(certificates.setId, sets.id)),
  );
  const within = grant.customerIds
    ? and(inArray(sets.customerId, [...grant.customerIds]), certified)
    : undefined;
  const [found] = await connection
    .select({ id: sets.id })
    .from(sets)
    .where(and(eq(sets.id, setId), within));
  if (!found) throw notFound("set");
}
