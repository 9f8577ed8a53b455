import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { addCalibratedBench } from "../../seed/factories/benches";
import { dayFromNow, type Lab, makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import { getBench } from "../../src/data/benches";
import { correctCalibration, recordCalibrations, revokeCalibration } from "../../src/data/calibrations";
import { asOwner } from "../support/databases";
import { fingerprint } from "../support/fingerprint";
import { refusalOf } from "../support/refusal-of";
import { setInReview } from "../support/set-in-review";

let lab: Lab;

beforeAll(async () => {
  lab = await makeLab();
});

/** A bench whose calibrations hold for these days from now, and its first channel's cylinder. */
async function aBench(from = -30, until = 60) {
  const fluidId = (await getBench(lab.manager.context, { benchId: lab.bench.benchId })).detail!.fluidId;
  const { benchId } = await addCalibratedBench(lab.manager.context, {
    code: `K-${randomUUID().slice(0, 4)}`,
    fluidId,
    validFrom: dayFromNow(from),
    validUntil: dayFromNow(until),
    channels: 2,
  });
  const [cylinder, other] = await cylindersOf(benchId);
  return { benchId, cylinder: cylinder!, other: other! };
}

async function cylindersOf(benchId: string) {
  const { detail } = await getBench(lab.manager.context, { benchId });
  return detail!.places.flatMap(({ kind, instrument }) =>
    kind === "cylinder" && instrument ? [instrument] : [],
  );
}

async function historyOf(benchId: string) {
  return (await cylindersOf(benchId))[0]!.calibrations;
}

type Typed = { reference?: string; gain?: string; validFrom?: string; validUntil?: string };

function entry(instrumentId: string, typed: Typed = {}) {
  return {
    instrumentId,
    reference: "K-2",
    gain: "1.0012",
    offset: "-0.04",
    gainU: "0.0006",
    offsetU: "0.02",
    validFrom: dayFromNow(61),
    validUntil: dayFromNow(400),
    note: "",
    ...typed,
  };
}

function record(benchId: string, entries: object[], takeOver = false) {
  return recordCalibrations(lab.manager.context, keyed({ benchId, entries, takeOver }));
}

describe("recording", () => {
  test("calibrations that follow one another cover without a gap", async () => {
    const { benchId, cylinder } = await aBench();
    await record(benchId, [entry(cylinder.instrumentId)]);
    const [first] = await cylindersOf(benchId);
    expect(first!.calibratedUntil?.toISOString().slice(0, 10)).toBe(dayFromNow(400));
    expect(await historyOf(benchId)).toMatchObject([{ reference: "K-2", inForce: false }, { inForce: true }]);
  });

  test("one that overlaps is refused with what stands there, and nothing of the table is recorded", async () => {
    const { benchId, cylinder, other } = await aBench();
    const before = await fingerprint();
    const refused = await refusalOf(
      record(benchId, [
        entry(other.instrumentId),
        entry(cylinder.instrumentId, { validFrom: dayFromNow(60) }),
      ]),
    );
    expect(refused.message).toContain(`${cylinder.code} already has a calibration in this period`);
    expect(await fingerprint()).toBe(before);
  });

  test("the database itself keeps two at once apart", async () => {
    const { benchId, cylinder } = await aBench();
    const outcomes = await Promise.allSettled(
      ["one", "other"].map((reference) => record(benchId, [entry(cylinder.instrumentId, { reference })])),
    );
    expect(outcomes.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    const [standing] = await historyOf(benchId);
    await expect(
      asOwner(
        (sql) => sql`
          insert into calibrations (instrument_id, reference, gain, offset_value, gain_u, offset_u, valid_from,
                                    valid_until, recorded_by)
          select instrument_id, 'again', gain, offset_value, gain_u, offset_u, valid_from, valid_until, recorded_by
            from calibrations where calibration_id = ${standing!.calibrationId}`,
      ),
    ).rejects.toThrow("calibrations_no_overlap");
  });

  test("a new one takes over now; what was in force until now stays on record as replaced", async () => {
    const { benchId, cylinder } = await aBench();
    await record(benchId, [entry(cylinder.instrumentId, { validFrom: dayFromNow(0) })], true);
    const [now, before] = await historyOf(benchId);
    expect(now).toMatchObject({ reference: "K-2", inForce: true });
    expect(before).toMatchObject({
      inForce: false,
      ended: { as: "replaced", reason: "Replaced by K-2", by: "Mara Quill" },
    });
    expect(now!.validFrom).toEqual(before!.ended!.at);
  });

  test("a row in which nothing was typed is left out; a row half typed names what is missing", async () => {
    const { benchId, cylinder, other } = await aBench();
    const empty = {
      ...entry(other.instrumentId),
      reference: "",
      gain: "",
      offset: "",
      gainU: "",
      offsetU: "",
    };
    expect(await record(benchId, [empty, entry(cylinder.instrumentId)])).toMatchObject({ recorded: 1 });
    const half = await refusalOf(record(benchId, [entry(cylinder.instrumentId), { ...empty, gain: "1.0" }]));
    expect((half.details as { fields: object }).fields).toEqual({
      "entries[1].reference": ["Reference is missing."],
      "entries[1].offset": ["Offset is missing."],
      "entries[1].gainU": ["u(gain) is missing."],
      "entries[1].offsetU": ["u(offset) is missing."],
    });
    const nothing = await refusalOf(record(benchId, [empty]));
    expect(JSON.stringify(nothing.details)).toContain("Please fill in at least one instrument.");
  });

  test.each([
    [{ gain: "0.4" }, "gain", "Gain lies between 0.5 and 2."],
    [{ gain: "Infinity" }, "gain", "Gain:"],
    [{ gain: "１" }, "gain", "Gain:"],
    [{ validFrom: "2026-02-30" }, "validFrom", "Valid from is a day such as 2026-03-14."],
    [
      { validFrom: dayFromNow(90), validUntil: dayFromNow(80) },
      "validUntil",
      "Valid until is not before valid from.",
    ],
    [{ reference: "R".repeat(10_000) }, "reference", "Reference has at most 80 characters."],
  ])("%j is named beside its field", async (typed, field, message) => {
    const { benchId, cylinder } = await aBench();
    const { details } = await refusalOf(record(benchId, [entry(cylinder.instrumentId, typed)]));
    const { fields } = details as { fields: Record<string, string[]> };
    expect(fields[`entries[0].${field}`]?.[0]).toContain(message);
  });

  test("an instrument that stands elsewhere is not calibrated from here", async () => {
    const [here, elsewhere] = [await aBench(), await aBench()];
    const refused = await refusalOf(record(here.benchId, [entry(elsewhere.cylinder.instrumentId)]));
    expect(refused.message).toBe("An instrument in the table is no longer on this bench.");
  });
});

describe("correcting", () => {
  const corrected = {
    reference: "K-1 read again",
    gain: "1.002",
    offset: "0",
    gainU: "0.001",
    offsetU: "0.03",
  };

  test("the wrong entry stays with the reason, and the right one names it", async () => {
    const { benchId, cylinder } = await aBench();
    const [wrong] = cylinder.calibrations;
    const correction = keyed({
      calibrationId: wrong!.calibrationId,
      ...corrected,
      validUntil: dayFromNow(60),
      note: "",
      reason: "A digit was dropped.",
    });
    await correctCalibration(lab.manager.context, correction);
    const history = await historyOf(benchId);
    expect(history.find(({ inForce }) => inForce)).toMatchObject({
      gain: 1.002,
      validFrom: wrong!.validFrom,
      validUntil: wrong!.validUntil,
      corrects: { reference: wrong!.reference, reason: "A digit was dropped." },
    });
    expect(history.find((each) => each.calibrationId === wrong!.calibrationId)).toMatchObject({
      inForce: false,
      gain: wrong!.gain,
      ended: { as: "corrected", reason: "A digit was dropped." },
    });
    const again = await refusalOf(
      correctCalibration(lab.manager.context, { ...correction, idempotencyKey: randomUUID() }),
    );
    expect(again.message).toBe(`Calibration ${wrong!.reference} was already corrected.`);
  });
});

describe("revoking", () => {
  test("an instrument without a calibration takes the bench out of calibration", async () => {
    const { benchId, cylinder } = await aBench();
    const { calibrationId } = cylinder.calibrations[0]!;
    await revokeCalibration(
      lab.manager.context,
      keyed({ calibrationId, reason: "The reference was chipped." }),
    );
    expect((await getBench(lab.counter.context, { benchId })).state).toBe("overdue");
  });

  test("every certificate that rests on it is named", async () => {
    const { setId } = await setInReview(lab);
    const { number } = await release(lab.manager.context, setId);
    const [cylinder] = await cylindersOf(lab.bench.benchId);
    const { calibrationId } = cylinder!.calibrations[0]!;
    const { certificates } = await revokeCalibration(
      lab.manager.context,
      keyed({ calibrationId, reason: "The reference was chipped." }),
    );
    expect(certificates.map((certificate) => certificate.number)).toEqual([number]);
    const [entered] = (await cylindersOf(lab.bench.benchId))[0]!.calibrations;
    expect(entered!.certificates).toMatchObject([{ number, state: "current" }]);
  });
});
