import { z } from "zod";
import { staffRoles } from "../../db/vocabulary";
import { baseVersion, choice, choices, email, id, page, searched, text, tick, writeInput } from "../fields";

export const personKinds = ["staff", "customer"] as const;

const noChoice = z
  .literal("")
  .optional()
  .transform(() => null);

export const addPersonInput = writeInput({
  name: text({ label: "Name", longest: 120 }),
  email: email(),
  kind: choice("Works for", personKinds),
  roles: choices("Roles", staffRoles),
  customerId: noChoice.or(id("customer")),
}).superRefine(({ kind, roles, customerId }, context) => {
  if (kind === "staff" && roles.length === 0)
    context.addIssue({ code: "custom", path: ["roles"], message: "Roles: please choose at least one." });
  if (kind === "customer" && !customerId)
    context.addIssue({ code: "custom", path: ["customerId"], message: "Please choose a customer." });
});

const person = { personId: id("person") };

export const setPersonRolesInput = writeInput({
  ...person,
  version: baseVersion,
  roles: choices("Roles", staffRoles),
  customerIds: z.preprocess(
    (typed) => [typed].flat().filter((each) => each !== undefined && each !== ""),
    z
      .array(id("customer"))
      .max(50, "A person acts for at most 50 customers.")
      .transform((ids) => [...new Set(ids)].sort()),
  ),
});
export const setPersonActiveInput = writeInput({ ...person, active: tick() });
export const renewEntryLinkInput = writeInput(person);
export const endPersonSignInsInput = writeInput(person);

export const getPersonInput = z.object(person);

export const peopleShown = ["staff", "customers", "disabled"] as const;
export const listPeopleInput = page.extend({
  search: searched(),
  shown: z.enum(peopleShown).nullable().catch(null),
});

export const endOwnSignInInput = writeInput({ signInId: z.string().regex(/^[0-9a-f]{16}$/) });

/** Without a key: the key's record would keep a quick hash of the passwords. */
export const changeOwnPasswordInput = z.object({
  oldPassword: z.string({ error: "Password now is missing." }).min(1, "Password now is missing.").max(4000),
  newPassword: z
    .string({ error: "New password is missing." })
    .min(1, "New password is missing.")
    .max(4000, "New password has at most 1000 characters."),
});
