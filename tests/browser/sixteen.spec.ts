import { actingAs, keyed } from "../../seed/factories/acting";
import { dayFromNow } from "../../seed/factories/lab";
import { addSomeModel } from "../../seed/factories/models";
import { checkIn } from "../../seed/factories/sets";
import { findCustomers } from "../../src/data/customers";
import { openCycleDraft } from "../../src/data/cycles";
import { listToleranceClasses } from "../../src/data/tolerance-classes";
import { benchInForce } from "./support/bench-in-force";
import { paste, typeConditions } from "./support/bench-page";
import { asPasted, readingsOf, type Truth } from "./support/bench-readings";
import { personIdOf } from "./support/sign-in";
import { expect, test } from "./support/test";

const count = 16;
const bad = 4;
const swapped = [1, 10] as const;

/** Invented: as found they differ by some percent, and one hardly opens. */
const truths = Array.from({ length: count }, (_, index): Truth => {
  return {
    staticMlPerMin: index === bad ? 352 : 436 + 11 * Math.sin(index * 2.3),
    deadTimeMs: 0.93 + 0.008 * Math.cos(index * 1.7),
    ohmsAt20C: 12,
  };
});

test("of sixteen injectors the page says which is bad, which two were exchanged and which column is shifted, before anything is recorded", async ({
  as,
}) => {
  const { draftId, tags } = await openSheet();
  const bench = await benchInForce("B1");
  const readings = readingsOf(truths, bench.channels, bench);
  // Load 2 uses the channels again, so the place decides the channel.
  exchange(readings, 5, swapped);
  shiftDown(readings, 3);

  const page = await as(await personIdOf("tomas.brandt@evenrail.example"));
  await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
  await page.goto(`/bench/${draftId}`);
  await typeConditions(page, { bench: "B1", temperatureC: "21", pressureKpa: "300" });
  await paste(page, 0, "w1", asPasted(readings));

  const doubts = page.getByRole("list", { name: /doubtful reading/ });
  await expect(doubts).toContainText("shifted down by one injector");
  await expect(doubts.getByRole("listitem").filter({ hasText: "shifted" })).toContainText(/4\sms/);
  const exchanged = doubts.getByRole("listitem").filter({ hasText: "exchanged" }).first();
  await expect(exchanged).toContainText(tags[swapped[0]]!);
  await expect(exchanged).toContainText(tags[swapped[1]]!);
  await expect(doubts.getByRole("listitem").filter({ hasText: tags[bad]! }).first()).toBeVisible();

  await page.getByRole("button", { name: "Record cycle" }).click();
  const dialog = page.getByRole("dialog");
  await dialog.getByRole("button", { name: "Record cycle" }).click();
  await expect(dialog.getByRole("alert")).toContainText("Doubtful readings are looked at first");
  await expect(dialog.getByRole("alert")).toContainText("shifted down by one injector");
});

type Readings = ReturnType<typeof readingsOf>;

function exchange(readings: Readings, column: number, [one, other]: readonly [number, number]) {
  const kept = readings[one]!.amounts[column]!;
  readings[one]!.amounts[column] = readings[other]!.amounts[column]!;
  readings[other]!.amounts[column] = kept;
}

/** The copied column began one cell too high. */
function shiftDown(readings: Readings, column: number) {
  const column_ = readings.map(({ amounts }) => amounts[column]!);
  readings.forEach(({ amounts }, index) => {
    amounts[column] = column_[index === 0 ? 0 : index - 1]!;
  });
}

async function openSheet() {
  const act = async (email: string, role: "counter" | "technician" | "manager") =>
    actingAs({ personId: await personIdOf(email), name: email, roles: [role] });
  const counter = await act("ines.fallow@evenrail.example", "counter");
  const [customer] = await findCustomers(counter, { search: "Sallow" });
  const [toleranceClass] = await listToleranceClasses(counter);
  const manager = await act("mara.quill@evenrail.example", "manager");
  const { setId, injectors } = await checkIn(counter, {
    customerId: customer!.customerId,
    modelId: await addSomeModel(manager, { partNumber: `KX-440 ${process.pid}` }),
    toleranceClassId: toleranceClass!.toleranceClassId,
    promisedOn: dayFromNow(6),
    serials: Array.from({ length: count }, () => null),
  });
  const technician = await act("tomas.brandt@evenrail.example", "technician");
  const { draftId } = await openCycleDraft(technician, keyed({ setId, phase: "as found" }));
  return { draftId, tags: injectors.map(({ tag }) => tag) };
}
