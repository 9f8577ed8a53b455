import "server-only";
import { inArray } from "drizzle-orm";
import type { Transaction } from "../../db/client";
import { calibrations } from "../../db/schema/calibrations";
import { Refusal, refused } from "../access/errors";
import { earlierFiguresOf } from "./earlier-figures";
import { injectorsOfDraft } from "./injectors-of-draft";
import { loadBenches } from "./load-benches";
import { loadFluids } from "./load-fluids";
import { loadSetBasis, type SetBasis } from "./load-set-basis";
import type { OpenDraft } from "./lock-open-draft";
import type { AcknowledgedFinding } from "./results";
import { isAcknowledged } from "./sheet/acknowledge";
import { describeMissing } from "./sheet/describe-missing";
import { evaluateSheet } from "./sheet/evaluate-sheet";
import { instrumentsUsed, missingCalibrations } from "./sheet/missing-calibrations";
import { problemsOf } from "./sheet/problems-of";
import { readSheet } from "./sheet/read-sheet";
import type { CycleBench, Sheet } from "./sheet/types";

type Recordable = { sheet: Sheet; bench: CycleBench; findings: AcknowledgedFinding[] };

/**
 * The sheet of a draft, complete and on calibrations in force: now, or at the moment the cycle was measured when it is
 * corrected. Refused with what is missing otherwise. Doubtful readings must each have been acknowledged.
 */
export async function requireRecordable(
  transaction: Transaction,
  draft: OpenDraft,
  measuredAt?: Date,
): Promise<Recordable> {
  const injectors = await injectorsOfDraft(transaction, draft);
  const sheet = readSheet(draft.fields, injectors);
  const [bench = null] = sheet.benchId
    ? await loadBenches(transaction, { benchId: sheet.benchId, at: measuredAt })
    : [];
  const problems = problemsOf(draft.fields, sheet, bench);
  if (!bench || Object.keys(problems).length > 0)
    throw new Refusal("invalid", "The sheet is not complete.", { fields: problems });
  if (!measuredAt) requireInService(bench);
  const basis = (await loadSetBasis(transaction, [draft.setId])).get(draft.setId)!;
  requireCalibrations(bench, sheet, basis.zone);
  if (!measuredAt) await lockCalibrations(transaction, bench, sheet);
  return { sheet, bench, findings: await requireAcknowledged(transaction, draft, basis, { sheet, bench }) };
}

function requireInService(bench: CycleBench): void {
  if (bench.retired) throw refused(`Bench ${bench.code} is retired.`);
  if (bench.holdReason !== null)
    throw refused(`Bench ${bench.code} is on hold: ${bench.holdReason}`, ["The manager clears it first."]);
}

function requireCalibrations(bench: CycleBench, sheet: Sheet, zone: string): void {
  const missing = missingCalibrations(bench, sheet);
  if (missing.length === 0) return;
  throw refused(
    `Bench ${bench.code} is not in calibration for this cycle.`,
    missing.map((each) => describeMissing(each, zone)),
  );
}

/** None of the calibrations that the cycle will rest on is revoked before it is written. */
async function lockCalibrations(transaction: Transaction, bench: CycleBench, sheet: Sheet): Promise<void> {
  const locked = await transaction
    .select({ endedAt: calibrations.endedAt })
    .from(calibrations)
    .where(
      inArray(
        calibrations.id,
        instrumentsUsed(bench, sheet).map((instrument) => instrument.calibration!.calibrationId),
      ),
    )
    .for("share");
  if (locked.some((calibration) => calibration.endedAt !== null))
    throw refused(`A calibration on bench ${bench.code} was ended just now. Please look at the bench.`);
}

async function requireAcknowledged(
  transaction: Transaction,
  draft: OpenDraft,
  basis: SetBasis,
  { sheet, bench }: { sheet: Sheet; bench: CycleBench },
): Promise<AcknowledgedFinding[]> {
  const fluids = await loadFluids(transaction);
  const earlier = await earlierFiguresOf(transaction, draft, basis);
  const { findings } = evaluateSheet(sheet, { bench, fluids, ...basis, earlier });
  const open = findings.filter((finding) => !isAcknowledged(finding, sheet, draft.fields));
  if (open.length > 0)
    throw refused(
      "Doubtful readings are looked at first: read them again, or mark them as recorded as read.",
      open.map((finding) => finding.sentence),
    );
  return findings.map(({ key, sentence }) => ({ key, sentence }));
}
