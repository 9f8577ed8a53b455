import { readFileSync } from "node:fs";
import { requireSpace } from "./disk.mjs";
import { Refusal } from "./failure.mjs";
import { runTool } from "./processes.mjs";
import { inProject } from "./project.mjs";

/** Installs exactly what the lock file says, unless that is what is there. `beforeChange` may refuse. */
export async function ensurePackages(beforeChange = () => {}) {
  if (installedAsLocked()) return "as locked";
  beforeChange();
  requireSpace();
  try {
    await runTool("npm ci", [...npm(), "ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"]);
  } catch (error) {
    if (!networkGone.test(error.output ?? "")) throw error;
    throw new Refusal(
      "The npm registry cannot be reached: connect this machine to the network, then run this again.",
      {
        cause: error,
      },
    );
  }
  return "installed";
}

const networkGone = /ENOTFOUND|EAI_AGAIN|ECONNREFUSED|ETIMEDOUT|ENETUNREACH|EHOSTUNREACH|ERR_SOCKET_TIMEOUT/;

/** npm writes down what it has installed as the last thing it does, in the form of the lock file. */
function installedAsLocked() {
  const locked = packagesIn(inProject("package-lock.json"));
  const installed = packagesIn(inProject("node_modules", ".package-lock.json"));
  if (!locked) throw new Refusal("package-lock.json is missing: check the project out again.");
  if (!installed) return false;
  return Object.entries(locked).every(([path, entry]) => {
    if (path === "") return true;
    const found = installed[path];
    return found
      ? found.version === entry.version && found.integrity === entry.integrity
      : entry.optional === true;
  });
}

function packagesIn(path) {
  try {
    return JSON.parse(readFileSync(path, "utf8")).packages;
  } catch (error) {
    if (error.code === "ENOENT" || error instanceof SyntaxError) return undefined;
    throw error;
  }
}

function npm() {
  const script = process.env.npm_execpath;
  return script?.endsWith(".js") ? [process.execPath, script] : ["npm"];
}
