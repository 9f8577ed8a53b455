import { z } from "zod";
import { baseVersion, email, id, optionalText, page, searched, text, writeInput } from "../fields";

/** The customer's own data; part of check-in too, where a new customer is entered in the same form. */
export const customerFields = {
  name: text({ label: "Customer's name", longest: 160 }),
  contactName: optionalText({ label: "Contact", longest: 120 }),
  email: z.union([
    z
      .literal("")
      .optional()
      .transform(() => ""),
    email(),
  ]),
  phone: optionalText({ label: "Phone", longest: 60 }),
  address: optionalText({ label: "Address", longest: 600, lines: "many" }),
  internalNote: optionalText({ label: "Internal note", longest: 4000, lines: "many" }),
};

export const addCustomerInput = writeInput(customerFields);
export const editCustomerInput = writeInput({
  customerId: id("customer"),
  version: baseVersion,
  ...customerFields,
});
export const getCustomerInput = z.object({ customerId: id("customer") });
export const findCustomersInput = z.object({ search: searched() });
export const listCustomersInput = page.extend({ search: searched() });
