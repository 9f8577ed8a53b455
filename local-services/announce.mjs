import { failure } from "./application.mjs";
import { addressOf } from "./scripts.mjs";
import { untilStopped } from "./session.mjs";
import { say, table } from "./terminal.mjs";

export function announce(port, signIns) {
  say(`\nEvenrail is at ${addressOf(port)}`);
  if (signIns.length > 0) say("\nSign in as one of the demo's people:");
  const rows = signIns.map(({ role, name, email, password }) => [role, name, email, password]);
  if (rows.length > 0)
    for (const line of table([["role", "name", "e-mail", "password"], ...rows])) say(`  ${line}`);
  say("\nCtrl-C stops it. What is recorded stays for the next start.\n");
}

/** Shows what the application says until it is stopped; an application that ends by itself is a failure. */
export async function stayUntilStopped(service) {
  service.pass((text) => process.stdout.write(text));
  await Promise.race([untilStopped(), failure(service)]);
  say("\nStopping: requests in progress are finished first.");
}
