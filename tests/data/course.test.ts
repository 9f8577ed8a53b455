import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { recordSyntheticCycle, typeSyntheticCycle } from "../../seed/factories/cycles";
import { dayFromNow, type Lab, makeLab } from "../../seed/factories/lab";
import { checkIn } from "../../seed/factories/sets";
import { clean, release } from "../../seed/factories/steps";
import { makeSetTruth } from "../../seed/factories/synthetic-bench";
import { isRefusal } from "../../src/data/access/errors";
import { holdBench } from "../../src/data/benches";
import { getCertificate, getCertificateFile, getDataSheet } from "../../src/data/certificates";
import {
  getSetResults,
  openCycleCorrection,
  openCycleDraft,
  recordCycle,
  recordCycleCorrection,
  saveCycleDraft,
  sendToReview,
} from "../../src/data/cycles";
import { draftField } from "../../src/data/cycles/draft-fields";
import { clearSetHold, getSet, handOverSet, holdSet, rejectInjector } from "../../src/data/sets";
import { asOwner } from "../support/databases";

let lab: Lab;
const truth = makeSetTruth(7, 4, { ratedFlowMlPerMin: 440, ohms: 12 });

beforeAll(async () => {
  lab = await makeLab();
});

async function arrived(serials: (string | null)[] = [null, null, null, null]) {
  return checkIn(lab.counter.context, {
    customerId: lab.customer,
    modelId: lab.modelId,
    toleranceClassId: lab.toleranceClassId,
    promisedOn: dayFromNow(5),
    serials,
  });
}

function measure(setId: string, phase: "as found" | "as left") {
  const truths = phase === "as found" ? truth.asFound : truth.asLeft;
  return recordSyntheticCycle(lab.technician.context, {
    setId,
    phase,
    benchId: lab.bench.benchId,
    truths,
    seed: phase === "as found" ? 1 : 2,
  });
}

async function reviewed() {
  const { setId } = await arrived();
  await measure(setId, "as found");
  await clean(lab.technician.context, setId);
  await measure(setId, "as left");
  await sendToReview(lab.technician.context, keyed({ setId }));
  return setId;
}

async function refusalOf(work: Promise<unknown>) {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!isRefusal(error)) throw error ?? new Error("It was not refused");
  return error;
}

test("a set goes its whole course, and its customer gets certificate and data sheet", async () => {
  const setId = await reviewed();
  const { certificateId, number } = await release(lab.manager.context, setId);
  expect(number).toMatch(/^C\d{2}-\d{4}\/1$/);
  await handOverSet(
    lab.counter.context,
    keyed({ setId, takenBy: "Orrin Hale", way: "collected", consignment: "" }),
  );
  expect((await getSet(lab.counter.context, { setId })).stage).toBe("handed over");
  const { bytes, sha256 } = await getCertificateFile(lab.customerPerson.context, { certificateId });
  expect(new TextDecoder().decode(bytes.slice(0, 5))).toBe("%PDF-");
  const { pdfSha256 } = await getCertificate(lab.customerPerson.context, { certificateId });
  expect(sha256).toBe(pdfSha256);
  const { text } = await getDataSheet(lab.customerPerson.context, { certificateId, format: "csv" });
  expect(text.split("\r\n")[0]).toContain("static_flow_ml_per_min");
});

test("another customer finds nothing of it, as if it did not exist", async () => {
  const setId = await reviewed();
  const { certificateId } = await release(lab.manager.context, setId);
  const other = lab.otherCustomerPerson.context;
  for (const look of [
    () => getSet(other, { setId }),
    () => getSetResults(other, { setId }),
    () => getCertificate(other, { certificateId }),
    () => getCertificateFile(other, { certificateId }),
    () => getDataSheet(other, { certificateId, format: "json" }),
  ])
    expect((await refusalOf(look())).kind).toBe("not found");
});

test("a customer sees no results before they are certified", async () => {
  const setId = await reviewed();
  expect((await getSet(lab.customerPerson.context, { setId })).stage).toBe("in review");
  expect((await refusalOf(getSetResults(lab.customerPerson.context, { setId }))).kind).toBe("not found");
});

test("steps out of order say what is missing", async () => {
  const { setId } = await arrived();
  const early = await refusalOf(openCycleDraft(lab.technician.context, keyed({ setId, phase: "as left" })));
  expect(early.message).toBe("A set that is checked in takes no cycle as left.");
  const review = await refusalOf(sendToReview(lab.technician.context, keyed({ setId })));
  expect(review.kind).toBe("refused");
  const leaving = await refusalOf(
    handOverSet(lab.counter.context, keyed({ setId, takenBy: "X", way: "collected", consignment: "" })),
  );
  expect(leaving.kind).toBe("refused");
});

test("a set on hold rests until somebody takes it off hold", async () => {
  const { setId } = await arrived();
  await holdSet(lab.counter.context, keyed({ setId, reason: "The customer is asked." }));
  const refused = await refusalOf(
    openCycleDraft(lab.technician.context, keyed({ setId, phase: "as found" })),
  );
  expect(
    [refused.message, ...((refused.details as { missing?: string[] }).missing ?? [])].join(" "),
  ).toContain("hold");
  await clearSetHold(lab.counter.context, keyed({ setId, reason: "The customer agreed." }));
  await openCycleDraft(lab.technician.context, keyed({ setId, phase: "as found" }));
});

test("who recorded a part does not release, unless another does", async () => {
  const another = await makeLab();
  const setId = await reviewed();
  await asOwner(
    (sql) => sql`insert into person_roles (person_id, role) values (${lab.technician.personId}, 'manager')`,
  );
  const context = lab.technician.context;
  if (context.actor.kind !== "person") throw new Error("a person was expected");
  const asManager = { ...context, actor: { ...context.actor, roles: ["technician", "manager"] as const } };
  const refused = await refusalOf(release(asManager, setId));
  expect(refused.message).toBe("You recorded part of these results: somebody else releases them.");
  await release(another.manager.context, setId);
});

test("what changed after the manager looked is not approved unseen", async () => {
  const setId = await reviewed();
  const { version } = await getSet(lab.manager.context, { setId });
  const { releaseCertificate, seenRecords } = await import("../../src/data/certificates");
  const seen = seenRecords(await getSetResults(lab.manager.context, { setId }));
  const { asLeft } = await getSetResults(lab.technician.context, { setId });
  const { draftId } = await openCycleCorrection(lab.technician.context, keyed({ cycleId: asLeft!.cycleId }));
  const field = draftField.condition("fluidTemperatureC");
  const { fields } = await asOwner(async (sql) => {
    const [row] = await sql<{ fields: Record<string, string> }[]>`
      select fields from cycle_drafts where cycle_draft_id = ${draftId}`;
    return row!;
  });
  const saved = await saveCycleDraft(
    lab.technician.context,
    keyed({ draftId, version: 1, changes: [{ field, base: fields[field]!, value: "22.4" }] }),
  );
  const corrected = await recordCycleCorrection(
    lab.technician.context,
    keyed({ draftId, version: saved.version, reason: "The thermometer was read wrongly." }),
  ).catch((error: unknown) => error);
  if (isRefusal(corrected)) throw corrected;
  const refused = await refusalOf(
    releaseCertificate(lab.manager.context, keyed({ setId, version, seen, paperSize: "A4", remarks: "" })),
  );
  expect((refused.details as { missing: string[] }).missing).toContain(
    "The as-left cycle has a newer revision than the one shown.",
  );
});

test("a bench on hold takes no cycle, in the database neither", async () => {
  const own = await makeLab();
  const { setId } = await checkIn(own.counter.context, {
    customerId: own.customer,
    modelId: own.modelId,
    toleranceClassId: own.toleranceClassId,
    promisedOn: dayFromNow(5),
  });
  const { draftId, version } = await typeSyntheticCycle(own.technician.context, {
    setId,
    phase: "as found",
    benchId: own.bench.benchId,
    truths: truth.asFound,
    seed: 3,
  });
  await holdBench(own.technician.context, keyed({ benchId: own.bench.benchId, reason: "The pump knocks." }));
  const refused = await refusalOf(recordCycle(own.technician.context, keyed({ draftId, version })));
  expect(refused.message).toContain("is on hold: The pump knocks.");
});

test("doubtful readings are looked at before a cycle is recorded", async () => {
  const { setId } = await arrived();
  const { draftId, version } = await typeSyntheticCycle(lab.technician.context, {
    setId,
    phase: "as found",
    benchId: lab.bench.benchId,
    truths: truth.asLeft,
    seed: 4,
    alter: (fields) => {
      const reading = Object.keys(fields).find((field) => /^reading\..*\.w4\.1$/.test(field))!;
      return { ...fields, [reading]: String(Number(fields[reading]) / 2) };
    },
  });
  const refused = await refusalOf(recordCycle(lab.technician.context, keyed({ draftId, version })));
  expect((refused.details as { missing: string[] }).missing.join(" ")).toMatch(/\/1 at 4\sms/);
});

test("two technicians on one sheet: the same field is a conflict with both texts, other fields join", async () => {
  const { setId } = await arrived();
  const { draftId } = await openCycleDraft(lab.technician.context, keyed({ setId, phase: "as found" }));
  const save = (
    who: "technician" | "otherTechnician",
    version: number,
    base: string,
    value: string,
    field = "note",
  ) => saveCycleDraft(lab[who].context, keyed({ draftId, version, changes: [{ field, base, value }] }));
  const first = await save("technician", 1, "", "mine");
  await save("otherTechnician", 1, "", "21", draftField.condition("fluidTemperatureC"));
  const conflict = await refusalOf(save("otherTechnician", first.version, "", "theirs"));
  expect(conflict.kind).toBe("conflict");
  expect(JSON.stringify(conflict.details)).toContain("mine");
});

test("the same form sent twice is one set", async () => {
  const { checkInSet } = await import("../../src/data/sets");
  const form = keyed({
    customer: { is: "known", customerId: lab.customer },
    model: { is: "known", modelId: lab.modelId },
    toleranceClassId: lab.toleranceClassId,
    workAsked: ["clean"],
    promisedOn: dayFromNow(3),
    customerRequest: "",
    internalNote: "",
    injectors: [{ serial: "", marking: "", condition: "sound", conditionNote: "" }],
  });
  const [one, other] = [
    await checkInSet(lab.counter.context, form),
    await checkInSet(lab.counter.context, form),
  ];
  expect(other).toEqual(one);
});

test("an injector that is in an open set is not checked in again", async () => {
  await arrived(["Z-1", "Z-2"]);
  const refused = await refusalOf(arrived(["Z-3", "z-1"]));
  expect(refused.kind).toBe("invalid");
  expect(JSON.stringify(refused.details)).toContain("injectors[1].serial");
});

test("a rejected injector counts no longer as left, and stays on record", async () => {
  const set = await arrived();
  await measure(set.setId, "as found");
  const [first] = set.injectors;
  await rejectInjector(
    lab.technician.context,
    keyed({ setInjectorId: first!.setInjectorId, reason: "The winding is open." }),
  );
  await clean(lab.technician.context, set.setId);
  await recordSyntheticCycle(lab.technician.context, {
    setId: set.setId,
    phase: "as left",
    benchId: lab.bench.benchId,
    truths: truth.asLeft.slice(1),
    seed: 5,
  });
  const { asFound, asLeft } = await getSetResults(lab.technician.context, { setId: set.setId });
  expect(asFound!.figures.injectors).toHaveLength(4);
  expect(asLeft!.figures.injectors).toHaveLength(3);
});
