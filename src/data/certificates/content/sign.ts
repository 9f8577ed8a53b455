import type { StaffRole } from "../../../db/vocabulary";
import type { Signature } from "../../../documents/certificate/content";
import type { CleaningRun, CycleRevision, PhaseResults, Recorder, SetResults } from "../../cycles/results";

const roleNames: Record<StaffRole, string> = {
  manager: "lab manager",
  technician: "bench technician",
  counter: "counter staff",
};

export function roleName(roles: readonly StaffRole[]): string {
  return roles.map((role) => roleNames[role]).join(", ");
}

/** Who recorded what counts, in the order of the work. */
export function signTests({ asFound, asLeft, cleaningRuns }: SetResults): Signature[] {
  const phases = [asFound, asLeft].filter((phase) => phase !== null);
  return [...phases.flatMap(signPhase), ...cleaningRuns.map(signCleaning)].sort((one, other) =>
    one.at.localeCompare(other.at),
  );
}

function signPhase({ phase, latest, earlierRevisions }: PhaseResults): Signature[] {
  const meaning = (revision: CycleRevision) =>
    revision.revision === 1 ? `measured ${phase}` : `corrected the record ${phase}`;
  return [...earlierRevisions, latest].map((revision) =>
    signature(revision.recordedBy, revision.recordedAt, meaning(revision)),
  );
}

function signCleaning({ recordedBy, recordedAt }: CleaningRun): Signature {
  return signature(recordedBy, recordedAt, "cleaned");
}

function signature({ name, roles }: Recorder, at: Date, meaning: string): Signature {
  return { name, role: roleName(roles), at: at.toISOString(), meaning };
}
