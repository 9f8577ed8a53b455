import { randomUUID } from "node:crypto";
import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { addCalibratedBench } from "../../seed/factories/benches";
import { dayFromNow, type Lab, makeLab } from "../../seed/factories/lab";
import type { Context } from "../../src/data/access/actor";
import {
  clearBenchHold,
  editBench,
  editInstrument,
  getBench,
  holdBench,
  listBenches,
  placeInstrument,
} from "../../src/data/benches";
import { fingerprint } from "../support/fingerprint";
import { refusalOf } from "../support/refusal-of";

let lab: Lab;
let fluidId: string;

beforeAll(async () => {
  lab = await makeLab();
  fluidId = (await detailOf(lab.bench.benchId)).fluidId;
});

function aBench({ until = 300, channels = 2 } = {}) {
  return addCalibratedBench(lab.manager.context, {
    code: `T-${randomUUID().slice(0, 4)}`,
    fluidId,
    validFrom: dayFromNow(-30),
    validUntil: dayFromNow(until),
    channels,
  });
}

async function detailOf(benchId: string, as: Context = lab.manager.context) {
  const { detail } = await getBench(as, { benchId });
  if (!detail) throw new Error("the bench's detail was expected");
  return detail;
}

async function stateOf(benchId: string) {
  return (await getBench(lab.counter.context, { benchId })).state;
}

async function editedAs(benchId: string, changes: object) {
  const { code, location, detail } = await getBench(lab.manager.context, { benchId });
  const { version, repeatability, driveVolts, driverKind, periodMs } = detail!;
  const values = { code, location, repeatability, fluidId, driveVolts, driverKind, periodMs };
  return keyed({ benchId, version, ...values, retired: false, ...changes });
}

/** A thermometer as good as the one that stands there. */
function thermometer(benchId: string) {
  return keyed({
    benchId,
    channelId: "",
    kind: "thermometer",
    code: `TH-${randomUUID().slice(0, 6)}`,
    maker: "",
    serial: "",
    intervalMonths: "12",
    rangeHigh: "50",
    division: "0.1",
    reason: "The old one was dropped.",
  });
}

test("a new bench has an instrument in every place, named after it", async () => {
  const { benchId, code } = await aBench();
  const { places } = await detailOf(benchId);
  expect(places.slice(0, 2).map(({ instrument }) => instrument?.code)).toEqual([
    `CY-${code}-01`,
    `CY-${code}-02`,
  ]);
  expect(places.find(({ kind }) => kind === "pulse timer")?.instrument?.code).toBe(`PT-${code}`);
  expect(await stateOf(benchId)).toBe("in calibration");
});

test("two benches do not share a code", async () => {
  const { code } = await aBench();
  const refused = await refusalOf(
    editBench(lab.manager.context, await editedAs((await aBench()).benchId, { code })),
  );
  expect(refused.details).toEqual({ fields: { code: [`There is already a bench ${code}.`] } });
});

test("a bench is due thirty days before the first of its calibrations ends", async () => {
  const [due, notYet] = [await aBench({ until: 29 }), await aBench({ until: 31 })];
  expect([await stateOf(due.benchId), await stateOf(notYet.benchId)]).toEqual(["due", "in calibration"]);
});

test("the counter sees how a bench stands and nothing of its figures", async () => {
  const { benchId } = await aBench();
  await holdBench(lab.technician.context, keyed({ benchId, reason: "The pump knocks." }));
  const seen = await getBench(lab.counter.context, { benchId });
  expect(seen).toMatchObject({ state: "on hold", detail: null });
  const row = (await listBenches(lab.counter.context)).find((each) => each.benchId === benchId);
  expect(row?.detail).toBeNull();
});

test("a bench is held once, and released with a reason that stays beside it", async () => {
  const { benchId, code } = await aBench();
  await holdBench(lab.technician.context, keyed({ benchId, reason: "The pump knocks." }));
  const again = await refusalOf(holdBench(lab.manager.context, keyed({ benchId, reason: "Again." })));
  expect(again.message).toBe(`Bench ${code} is already on hold.`);
  const silent = await refusalOf(clearBenchHold(lab.manager.context, keyed({ benchId, reason: "  " })));
  expect(silent.details).toEqual({ fields: { reason: ["Reason is missing."] } });
  await clearBenchHold(lab.manager.context, keyed({ benchId, reason: "A new coupling is in." }));
  const { hold, earlierHolds } = await detailOf(benchId);
  expect(hold).toBeNull();
  expect(earlierHolds).toMatchObject([
    { reason: "The pump knocks.", by: "Tomas Brandt", clearedReason: "A new coupling is in." },
  ]);
  expect(await stateOf(benchId)).toBe("in calibration");
});

test("a new instrument takes the old one's place, and the bench waits for its calibration", async () => {
  const { benchId, code } = await aBench();
  await placeInstrument(lab.manager.context, thermometer(benchId));
  const { earlierInstruments } = await detailOf(benchId);
  expect(earlierInstruments.map((earlier) => earlier.code)).toEqual([`TH-${code}`]);
  expect(await stateOf(benchId)).toBe("overdue");
});

test("a channel takes what the bench collects in, and no other bench's channel", async () => {
  const { benchId } = await aBench();
  const { places } = await detailOf((await aBench()).benchId);
  const before = await fingerprint();
  const own = (await detailOf(benchId)).places[0]!.channelId!;
  const balance = { ...thermometer(benchId), channelId: own, kind: "balance" };
  expect((await refusalOf(placeInstrument(lab.manager.context, balance))).details).toEqual({
    fields: { kind: ["A channel of this bench takes a cylinder."] },
  });
  const foreign = { ...thermometer(benchId), channelId: places[0]!.channelId!, kind: "cylinder" };
  expect((await refusalOf(placeInstrument(lab.manager.context, foreign))).kind).toBe("not found");
  expect(await fingerprint()).toBe(before);
});

test("an instrument's scale is not edited: recorded figures rest on it", async () => {
  const { benchId } = await aBench();
  const { instrument } = (await detailOf(benchId)).places[0]!;
  await editInstrument(
    lab.manager.context,
    keyed({
      instrumentId: instrument!.instrumentId,
      version: 1,
      code: instrument!.code,
      maker: "Halm",
      serial: "7",
      intervalMonths: "6",
      rangeHigh: "9",
      division: "9",
    }),
  );
  expect((await detailOf(benchId)).places[0]!.instrument).toMatchObject({
    maker: "Halm",
    intervalMonths: 6,
    rangeHigh: instrument!.rangeHigh,
    division: instrument!.division,
  });
});

test("of two edits at once the second is shown both values, and changes nothing", async () => {
  const { benchId } = await aBench();
  const [mine, theirs] = [
    await editedAs(benchId, { location: "Room 2" }),
    await editedAs(benchId, { location: "Cellar" }),
  ];
  await editBench(lab.manager.context, theirs);
  const before = await fingerprint();
  const refused = await refusalOf(editBench(lab.manager.context, mine));
  expect(refused.details).toMatchObject({
    values: [{ field: "location", label: "Location", theirs: "Cellar", yours: "Room 2" }, {}],
  });
  expect(await fingerprint()).toBe(before);
});

test("a retired bench is listed only when asked for, and takes no hold", async () => {
  const { benchId, code } = await aBench();
  await editBench(lab.manager.context, await editedAs(benchId, { retired: true }));
  const listed = async (withRetired: boolean) =>
    (await listBenches(lab.manager.context, { withRetired })).some((bench) => bench.benchId === benchId);
  expect([await listed(false), await listed(true)]).toEqual([false, true]);
  const refused = await refusalOf(holdBench(lab.technician.context, keyed({ benchId, reason: "It leaks." })));
  expect(refused.message).toBe(`Bench ${code} is retired.`);
});

test.each([
  ["-1", "Repeatability lies between 0 and 100."],
  ["1e309", "Repeatability:"],
  ["NaN", "Repeatability:"],
  ["", "Repeatability is missing."],
  ["0.000001", "Repeatability has at most 5 decimals."],
])("a repeatability of %j is named with its limit", async (repeatability, message) => {
  const { details } = await refusalOf(
    editBench(lab.manager.context, await editedAs(lab.bench.benchId, { repeatability })),
  );
  expect((details as { fields: Record<string, string[]> }).fields.repeatability?.[0]).toContain(message);
});
