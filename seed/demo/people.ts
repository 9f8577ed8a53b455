import { randomUUID } from "node:crypto";
import { checkNewPassword, storePassword } from "../../src/auth/set-password";
import { recordEvent } from "../../src/data/audit/record-event";
import { database } from "../../src/db/client";
import { addCustomerPerson, addWorker, type Worker } from "../factories/people";
import signIns from "../sign-ins.json";

export type Staff = Awaited<ReturnType<typeof addStaff>>;

export async function addStaff() {
  return {
    manager: await withPassword(
      await addWorker("Mara Quill", "mara.quill@evenrail.example", ["manager"]),
      "mara.quill",
    ),
    counter: await withPassword(
      await addWorker("Ines Fallow", "ines.fallow@evenrail.example", ["counter"]),
      "ines.fallow",
    ),
    technicians: [
      await withPassword(
        await addWorker("Tomas Brandt", "tomas.brandt@evenrail.example", ["technician"]),
        "tomas.brandt",
      ),
      await withPassword(
        await addWorker("Edda Voss", "edda.voss@evenrail.example", ["technician"]),
        "edda.voss",
      ),
    ] as const,
  };
}

export async function addDemoCustomerPerson(customerId: string): Promise<void> {
  const person = await addCustomerPerson("Orrin Hale", "orrin.hale@evenrail.example", customerId);
  await withPassword(person, "orrin.hale");
}

async function withPassword(worker: Worker, mailbox: string): Promise<Worker> {
  const signIn = signIns.find(({ email }) => email.startsWith(`${mailbox}@`));
  if (!signIn) throw new Error(`seed/sign-ins.json does not list ${mailbox}`);
  const { personId } = worker;
  const checked = await checkNewPassword(database(), personId, signIn.password);
  if ("problem" in checked) throw new Error(`The demo's password is refused: ${checked.problem}`);
  const context = { actor: { kind: "command", name: "set-up" }, requestId: randomUUID() } as const;
  await database().transaction(async (transaction) => {
    await storePassword(transaction, { personId, hash: checked.hash });
    await recordEvent(transaction, context, { event: "password set", noun: "person", objectId: personId });
  });
  return worker;
}
