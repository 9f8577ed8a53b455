import type { Context } from "../../src/data/access/actor";
import { addCustomer } from "../../src/data/customers";
import { keyed } from "../factories/acting";

/** Name and contact, both invented. The first has a person who signs in. */
const listed = [
  ["Orrin Engine Works", "Orrin Hale"],
  ["Sallow Ridge Racing", "Pia Sallow"],
  ["Tarn and Daughters Garage", "Wilma Tarn"],
  ["Fennick Motorsport", "Jory Fennick"],
  ["Brackwater Marine Service", "Odile Marsh"],
  ["Hollin Valley Tuning", "Kester Hollin"],
  ["Vesper Lane Workshop", "Anouk Vesper"],
  ["Marrowby Engines", "Tobin Marrow"],
  ["Quarrel Hill Classics", "Ester Quarrel"],
  ["Dunmoor Rally Team", "Lars Dunmoor"],
  ["Ashlock Field Machines", "Greta Ashlock"],
  ["Pell Street Garage", "Ivo Pell"],
] as const;

export async function addCustomers(counter: Context): Promise<string[]> {
  const ids: string[] = [];
  for (const [index, [name, contactName]] of listed.entries()) {
    const mailbox = contactName.toLowerCase().replace(" ", ".");
    const { customerId } = await addCustomer(
      counter,
      keyed({
        name,
        contactName,
        email: `${mailbox}@customers.example`,
        phone: `+00 555 02${String(index).padStart(2, "0")}`,
        address: `${3 + 7 * index} Harbour Road\nSkarne`,
        internalNote: index === 3 ? "Calls before every race weekend: tell them the day, not the hour." : "",
      }),
    );
    ids.push(customerId);
  }
  return ids;
}
