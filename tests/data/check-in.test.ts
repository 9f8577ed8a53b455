import { expect, test } from "vitest";
import { dayFromNow, makeLab } from "../../seed/factories/lab";
import { checkIn } from "../../seed/factories/sets";

test("a set that is checked in gets a number and a tag for each injector", async () => {
  const lab = await makeLab();
  const set = await checkIn(lab.counter.context, {
    customerId: lab.customer,
    modelId: lab.modelId,
    toleranceClassId: lab.toleranceClassId,
    promisedOn: dayFromNow(5),
    serials: ["A1", "A2", null],
  });
  expect(set.number).toMatch(/^\d{2}-\d{4}$/);
  expect(set.injectors.map(({ tag }) => tag)).toEqual([1, 2, 3].map((place) => `${set.number}/${place}`));
});
