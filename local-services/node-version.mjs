import { Refusal } from "./failure.mjs";
import { say } from "./terminal.mjs";

const oldest = [20, 9];
const endOfSupport = { 20: "2026-04-30" };

export function checkNode() {
  if (process.platform !== "linux") throw new Refusal("Evenrail starts its own PostgreSQL on Linux only.");
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major < oldest[0] || (major === oldest[0] && minor < oldest[1]))
    throw new Refusal(`Node.js ${process.versions.node} is too old: install Node.js 22 or 24.`);
  if (endOfSupport[major])
    say(
      `  Node.js ${major} has had no fixes since ${endOfSupport[major]}. Evenrail still runs on it; 22 or 24 is better.`,
    );
}
