import "server-only";
import { parseArgs } from "node:util";
import { isRefusal } from "../data/access/errors";
import { addPerson } from "../data/people";
import { closeDatabase } from "../db/client";
import { staffRoles } from "../db/vocabulary";

/**
 * npm run user:create -- --name "Mara Quill" --email mara@lab.example --role manager
 * The only way to the first manager. Prints the link by which the person sets a password.
 */
const { values } = parseArgs({
  options: {
    name: { type: "string" },
    email: { type: "string" },
    role: { type: "string", multiple: true, default: ["manager"] },
  },
});

try {
  const { entryLink } = await addPerson(
    { actor: { kind: "command", name: "user:create" }, requestId: crypto.randomUUID() },
    {
      idempotencyKey: crypto.randomUUID(),
      name: values.name,
      email: values.email,
      kind: "staff",
      roles: values.role,
      customerId: "",
    },
  );
  console.log(`${values.name} can set a password within 72 hours, once, at\n  ${entryLink}`);
} catch (error) {
  if (!isRefusal(error)) throw error;
  const said = isRefusal(error, "invalid") ? Object.values(error.details.fields).flat() : [];
  console.error([error.message, ...said].join("\n"));
  console.error(
    `Usage: npm run user:create -- --name NAME --email ADDRESS [--role ${staffRoles.join("|")}]…`,
  );
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
