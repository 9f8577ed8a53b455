import type { Context } from "../../src/data/access/actor";
import {
  type CycleDraft,
  getCycleDraft,
  openCycleDraft,
  recordCycle,
  saveCycleDraft,
} from "../../src/data/cycles";
import { type DraftFields, draftField, heldOpenColumn } from "../../src/data/cycles/draft-fields";
import { acknowledgementOf } from "../../src/data/cycles/sheet/acknowledge";
import { conditionsOfBench, placesOnBench } from "../../src/data/cycles/sheet/defaults";
import { evaluateSheet } from "../../src/data/cycles/sheet/evaluate-sheet";
import { readSheet } from "../../src/data/cycles/sheet/read-sheet";
import type { CycleBench } from "../../src/data/cycles/sheet/types";
import type { Phase } from "../../src/db/vocabulary";
import { keyed } from "./acting";
import { type InjectorTruth, indicatedBy, normalsFrom, type Run } from "./synthetic-bench";

type Recording = {
  setId: string;
  phase: Phase;
  benchId: string;
  /** One for each injector that stands in the set, by place. */
  truths: readonly InjectorTruth[];
  seed: number;
  temperatureC?: number;
  /** Changes what was typed before it is saved. */
  alter?: (fields: DraftFields) => DraftFields;
};

/** Logs a cycle as a technician does: opens the sheet, types it, looks at the doubtful readings, records it. */
export async function recordSyntheticCycle(technician: Context, recording: Recording) {
  const { draftId, draft, version, fields } = await typeSyntheticCycle(technician, recording);
  const acknowledged = acknowledgeAll(draft, fields);
  const last =
    Object.keys(acknowledged).length > 0
      ? (await saveFields(technician, { draftId, version, from: fields, to: acknowledged })).version
      : version;
  return recordCycle(technician, keyed({ draftId, version: last }));
}

/** The same up to the typed sheet. */
export async function typeSyntheticCycle(technician: Context, recording: Recording) {
  const { setId, phase, alter = (fields) => fields } = recording;
  const { draftId } = await openCycleDraft(technician, keyed({ setId, phase }));
  const draft = await getCycleDraft(technician, { draftId });
  const typed = alter(typedFields(draft, recording));
  const { version } = await saveFields(technician, {
    draftId,
    version: draft.version,
    from: draft.fields,
    to: typed,
  });
  return { draftId, draft, version, fields: { ...draft.fields, ...typed } };
}

type Saving = { draftId: string; version: number; from: DraftFields; to: DraftFields };

function saveFields(technician: Context, { draftId, version, from, to }: Saving) {
  const changes = Object.entries(to)
    .filter(([field, value]) => value !== (from[field] ?? ""))
    .map(([field, value]) => ({ field, base: from[field] ?? "", value }));
  return saveCycleDraft(technician, keyed({ draftId, version, changes }));
}

function typedFields(draft: CycleDraft, recording: Recording): DraftFields {
  const { benchId, truths, seed, temperatureC = 21 + (seed % 5) / 2 } = recording;
  const bench = draft.benches.find((candidate) => candidate.benchId === benchId);
  if (!bench) throw new Error(`The sheet does not offer bench ${benchId}`);
  const fields: DraftFields = {
    ...conditionsOfBench(bench),
    ...placesOnBench(draft.injectors, bench),
    [draftField.condition("fluidTemperatureC")]: temperatureC.toFixed(1),
    [draftField.condition("pressureKpa")]: draft.model.ratedPressureKpa.toFixed(0),
    [draftField.sharedCheck("windingTemperatureC")]: temperatureC.toFixed(1),
    [draftField.sharedCheck("leadOhm")]: "0.12",
    [draftField.sharedCheck("leakagePressureKpa")]: draft.model.ratedPressureKpa.toFixed(0),
    [draftField.sharedCheck("leakageSeconds")]: "60",
  };
  const normal = normalsFrom(seed);
  const sheet = readSheet({ ...draft.fields, ...fields }, draft.injectors);
  const columns = sheet.columns.filter((column) => !column.heldOpen);
  const run: Run = {
    temperatureC: trueBy(bench, "thermometer", temperatureC),
    pressureKpa: trueBy(bench, "pressure gauge", draft.model.ratedPressureKpa),
    reference: draft.reference,
    widths: columns.map(({ pulseWidthMs, pulseCount }) => ({
      pulseWidthMs: trueBy(bench, "pulse timer", pulseWidthMs!),
      pulseCount: pulseCount!,
    })),
    heldOpenSeconds: sheet.columns.find((column) => column.heldOpen)?.openSeconds ?? null,
  };
  for (const [place, { setInjectorId }] of draft.injectors.entries()) {
    const truth = truths[place];
    if (!truth) throw new Error(`There is no truth for the injector at place ${place + 1}`);
    const channel = channelOf(bench, Number(fields[draftField.channel(setInjectorId)]));
    const { amounts, heldOpen } = indicatedBy({ ...bench, channel }, truth, run, normal);
    columns.forEach(({ id }, column) => {
      fields[draftField.reading(setInjectorId, id, 1)] = String(amounts[column]);
    });
    if (heldOpen !== null) fields[draftField.reading(setInjectorId, heldOpenColumn, 1)] = String(heldOpen);
    Object.assign(fields, checksOf(setInjectorId, truth, temperatureC, normal));
  }
  return fields;
}

function checksOf(
  setInjectorId: string,
  truth: InjectorTruth,
  temperatureC: number,
  normal: () => number,
): DraftFields {
  const warm = truth.ohmsAt20C * ((234.5 + temperatureC) / 254.5) + 0.12 + 0.005 * normal();
  return {
    [draftField.check(setInjectorId, "windingOhm")]: warm.toFixed(2),
    [draftField.check(setInjectorId, "insulationMegohm")]: "500",
    [draftField.check(setInjectorId, "leakageMm3PerMin")]: truth.leakageMm3PerMin.toFixed(1),
    [draftField.check(setInjectorId, "sprayGrade")]: truth.sprayGrade,
  };
}

function channelOf(bench: CycleBench, number: number) {
  const instrument = bench.channels.find((channel) => channel.number === number)?.instrument;
  if (!instrument?.calibration) throw new Error(`Channel ${number} of ${bench.code} is not in calibration`);
  const { gain, offset } = instrument.calibration;
  return { gain, offset, division: instrument.division };
}

function trueBy(bench: CycleBench, kind: string, indicated: number): number {
  const calibration = bench.instruments.find((instrument) => instrument.kind === kind)?.calibration;
  return calibration ? calibration.gain * indicated + calibration.offset : indicated;
}

function acknowledgeAll(draft: CycleDraft, fields: DraftFields): DraftFields {
  const sheet = readSheet(fields, draft.injectors);
  const bench = draft.benches.find((candidate) => candidate.benchId === sheet.benchId)!;
  const { findings } = evaluateSheet(sheet, { ...draft, bench, draws: 100 });
  return Object.fromEntries(
    findings.map((finding) => [
      draftField.acknowledged(finding.key),
      acknowledgementOf(finding, sheet, fields),
    ]),
  );
}
