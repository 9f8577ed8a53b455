import { benchCertificate } from "./certificate";
import { benchFlowLine } from "./flow-line";
import type { BenchTable } from "./measure";
import { printTable } from "./print-table";
import { benchSetPage } from "./set-page";

/** `npm run bench` runs all of them, `npm run bench -- flow-line` those that are named. */
const benches: Record<string, () => Promise<BenchTable[]>> = {
  "flow-line": benchFlowLine,
  certificate: benchCertificate,
  "set-page": benchSetPage,
};

const asked = process.argv.slice(2);
const unknown = asked.filter((name) => !(name in benches));
if (unknown.length > 0) {
  console.error(`No bench is called ${unknown.join(", ")}. There are: ${Object.keys(benches).join(", ")}.`);
  process.exit(1);
}
for (const name of asked.length > 0 ? asked : Object.keys(benches))
  for (const table of await benches[name]!()) printTable(table);
