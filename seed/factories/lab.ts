import { randomBytes } from "node:crypto";
import { addCustomer } from "../../src/data/customers";
import { listFluids } from "../../src/data/fluids";
import { keyed } from "./acting";
import { addCalibratedBench } from "./benches";
import { addSomeModel } from "./models";
import { addCustomerPerson, addWorker } from "./people";
import { addSomeClass } from "./tolerance-classes";

export type Lab = Awaited<ReturnType<typeof makeLab>>;

/** Days from today, as inputs take them. */
export function dayFromNow(days: number): string {
  return new Date(Date.now() + days * 86_400_000).toISOString().slice(0, 10);
}

/** One of each: what a test needs to work in. Names carry a mark, so that two labs live in one database. */
export async function makeLab({ channels = 8 } = {}) {
  const mark = randomBytes(3).toString("hex");
  const manager = await addWorker("Mara Quill", `mara.${mark}@lab.example`, ["manager"]);
  const counter = await addWorker("Ines Fallow", `ines.${mark}@lab.example`, ["counter"]);
  const technician = await addWorker("Tomas Brandt", `tomas.${mark}@lab.example`, ["technician"]);
  const otherTechnician = await addWorker("Edda Voss", `edda.${mark}@lab.example`, ["technician"]);
  const customer = await addSomeCustomer(counter.context, `Orrin Engine Works ${mark}`);
  const otherCustomer = await addSomeCustomer(counter.context, `Sallow Ridge Racing ${mark}`);
  const [fluid] = await listFluids(manager.context);
  return {
    manager,
    counter,
    technician,
    otherTechnician,
    customer,
    customerPerson: await addCustomerPerson("Orrin Hale", `orrin.${mark}@works.example`, customer),
    otherCustomer,
    otherCustomerPerson: await addCustomerPerson("Pia Sallow", `pia.${mark}@ridge.example`, otherCustomer),
    modelId: await addSomeModel(manager.context, { partNumber: `KX-440 ${mark}` }),
    toleranceClassId: await addSomeClass(manager.context, `Road race ${mark}`),
    bench: await addCalibratedBench(manager.context, {
      code: `B-${mark}`,
      fluidId: fluid!.fluidId,
      validFrom: dayFromNow(-30),
      validUntil: dayFromNow(300),
      channels,
    }),
  };
}

async function addSomeCustomer(counter: Parameters<typeof addCustomer>[0], name: string): Promise<string> {
  const { customerId } = await addCustomer(
    counter,
    keyed({ name, contactName: "", email: "", phone: "", address: "", internalNote: "" }),
  );
  return customerId;
}
