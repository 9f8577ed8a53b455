import type { Context } from "../../src/data/access/actor";
import { addPerson } from "../../src/data/people";
import type { StaffRole } from "../../src/db/vocabulary";
import { actingAs, keyed, settingUp } from "./acting";

export type Worker = { personId: string; context: Context };

/** A member of staff, without a password: whoever acts for them needs none. */
export async function addWorker(name: string, email: string, roles: StaffRole[]): Promise<Worker> {
  const { personId } = await addPerson(
    settingUp(),
    keyed({ name, email, kind: "staff", roles, customerId: "" }),
  );
  return { personId, context: actingAs({ personId, name, roles }) };
}

export async function addCustomerPerson(name: string, email: string, customerId: string): Promise<Worker> {
  const { personId } = await addPerson(
    settingUp(),
    keyed({ name, email, kind: "customer", roles: [], customerId }),
  );
  return { personId, context: actingAs({ personId, name, roles: ["customer"], customerIds: [customerId] }) };
}
