import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { addSomeClass, roadRace } from "../../seed/factories/tolerance-classes";
import { addFluid, listFluids, setFluidRetired } from "../../src/data/fluids";
import { editLabDetails, getLabCard, getLabDetails } from "../../src/data/lab";
import { getSet } from "../../src/data/sets";
import {
  getToleranceClass,
  listToleranceClasses,
  reviseToleranceClass,
  setToleranceClassRetired,
} from "../../src/data/tolerance-classes";
import { asOwner } from "../support/databases";
import { eventsAfter, fingerprint, lastPosition } from "../support/fingerprint";
import { refusalOf } from "../support/refusal-of";
import { setInReview } from "../support/set-in-review";

let lab: Lab;

beforeAll(async () => {
  lab = await makeLab();
});

describe("the lab's details", () => {
  async function edited(changes: object = {}) {
    const { testPlan, ...details } = await getLabDetails(lab.manager.context);
    return keyed({ ...details, ...testPlan, ...changes });
  }

  async function fieldsRefused(changes: object) {
    const { details } = await refusalOf(editLabDetails(lab.manager.context, await edited(changes)));
    return (details as { fields: Record<string, string[]> }).fields;
  }

  test("a change keeps what it was and what it is", async () => {
    const position = await lastPosition();
    await editLabDetails(lab.manager.context, await edited({ name: "Tidewater Injection", phone: "555 01" }));
    const { event, after } = (await eventsAfter(position))[0]!;
    expect([event, after]).toEqual(["lab details changed", { name: "Tidewater Injection", phone: "555 01" }]);
    expect((await getLabCard(lab.customerPerson.context)).name).toBe("Tidewater Injection");
  });

  test("of two edits at once the second is shown both values", async () => {
    const [mine, theirs] = [await edited({ phone: "555 02" }), await edited({ phone: "555 03" })];
    await editLabDetails(lab.manager.context, theirs);
    const before = await fingerprint();
    const refused = await refusalOf(editLabDetails(lab.manager.context, mine));
    expect(refused.details).toMatchObject({
      values: [{ label: "Phone", theirs: "555 03", yours: "555 02" }, {}],
    });
    expect(await fingerprint()).toBe(before);
  });

  test("a time zone is one that the database knows too", async () => {
    expect(await fieldsRefused({ timeZone: "Nowhere/Atall" })).toHaveProperty("timeZone");
    expect(await fieldsRefused({ timeZone: "+02:00" })).toHaveProperty("timeZone");
  });

  test("a plan has three widths or more, each once", async () => {
    const width = (pulseWidthMs: string) => ({ pulseWidthMs, pulseCount: "1000" });
    expect(await fieldsRefused({ widths: [width("2"), width("3")] })).toEqual({
      widths: ["The test plan has at least three pulse widths: a line needs them."],
    });
    expect(await fieldsRefused({ widths: [width("2"), width("3"), width("2,0")] })).toEqual({
      "widths[2].pulseWidthMs": ["Pulse width 2 ms stands in the plan twice."],
    });
  });
});

describe("tolerance classes", () => {
  test("a revised class judges the next set; the revision before stays as it was", async () => {
    const toleranceClassId = await addSomeClass(lab.manager.context, "Rally");
    await reviseToleranceClass(
      lab.manager.context,
      keyed({ toleranceClassId, version: 1, ...roadRace, staticSpreadPercent: "1,5" }),
    );
    const { revisions } = await getToleranceClass(lab.manager.context, { toleranceClassId });
    expect(revisions.map(({ revision, staticSpreadPercent }) => [revision, staticSpreadPercent])).toEqual([
      [2, 1.5],
      [1, 2],
    ]);
  });

  test("nobody rewrites a revision, the application neither", async () => {
    const toleranceClassId = await addSomeClass(lab.manager.context, "Trial");
    await expect(
      asOwner(async (sql) => {
        await sql`set role evenrail_app`;
        await sql`update tolerance_class_revisions set static_spread_percent = 9
          where tolerance_class_id = ${toleranceClassId}`;
      }),
    ).rejects.toThrow("permission denied");
  });

  test("a retired class is offered no more, keeps its sets, and is not revised", async () => {
    const { setId } = await setInReview(lab);
    const { toleranceClassId } = lab;
    await setToleranceClassRetired(lab.manager.context, keyed({ toleranceClassId, retired: true }));
    const offered = await listToleranceClasses(lab.counter.context);
    expect(offered.map((each) => each.toleranceClassId)).not.toContain(toleranceClassId);
    expect((await getSet(lab.counter.context, { setId })).toleranceClass).toBeTruthy();
    const { version } = await getToleranceClass(lab.manager.context, { toleranceClassId });
    const refused = await refusalOf(
      reviseToleranceClass(lab.manager.context, keyed({ toleranceClassId, version, ...roadRace })),
    );
    expect(refused.message).toMatch(/is retired\. Reinstate it before it is revised\.$/);
    await setToleranceClassRetired(lab.manager.context, keyed({ toleranceClassId, retired: false }));
  });

  test("limits at one pulse width twice are refused beside the second", async () => {
    const limits = [
      { fromPulseWidthMs: "0", spreadPercent: "5" },
      { fromPulseWidthMs: "0.0", spreadPercent: "4" },
    ];
    const { details } = await refusalOf(
      reviseToleranceClass(
        lab.manager.context,
        keyed({ toleranceClassId: lab.toleranceClassId, version: 1, ...roadRace, limits }),
      ),
    );
    expect(details).toEqual({
      fields: { "limits[1].fromPulseWidthMs": ["Pulse width 0 ms stands here twice."] },
    });
  });
});

test("a fluid is added once, and a retired one is offered to no new cycle", async () => {
  const form = {
    name: `Bench fluid ${randomUUID().slice(0, 6)}`,
    densityAt15GPerMl: "0,769",
    expansionPerK: "0.00095",
    source: "Maker's sheet, 2025",
  };
  const { fluidId } = await addFluid(lab.manager.context, keyed(form));
  const twice = await refusalOf(addFluid(lab.manager.context, keyed(form)));
  expect(twice.details).toEqual({ fields: { name: [`There is already a fluid named ${form.name}.`] } });
  const offered = async () =>
    (await listFluids(lab.technician.context)).find((fluid) => fluid.fluidId === fluidId);
  expect(await offered()).toMatchObject({ densityAt15GPerMl: 0.769, expansionPerK: 0.00095 });
  await setFluidRetired(lab.manager.context, keyed({ fluidId, retired: true }));
  expect(await offered()).toBeUndefined();
});
