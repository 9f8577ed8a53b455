import { createInterface } from "node:readline";
import { leaveCluster } from "./postgres/leases.mjs";
import { stopGroup } from "./process-groups.mjs";

const launcher = JSON.parse(process.argv[2]);
const groups = new Map();
const leases = new Set();
const follow = {
  guardGroup: (group) => groups.set(group.pid, group.ending),
  forgetGroup: (pid) => groups.delete(pid),
  guardLease: (folder) => leases.add(folder),
  done: () => process.exit(0),
};

for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, () => {});

for await (const line of createInterface({ input: process.stdin })) {
  const [[kind, value]] = Object.entries(JSON.parse(line));
  follow[kind](value);
}

// The pipe closed without a word: the launcher was killed.
await Promise.all([...groups].map(([group, ending]) => stopGroup(group, ending)));
for (const folder of leases) await leaveCluster(folder, launcher);
