import { spawn } from "node:child_process";
import { ToolFailure } from "./failure.mjs";
import { forgetGroup, guardGroup } from "./guard.mjs";
import { stopGroup } from "./process-groups.mjs";
import { projectFolder } from "./project.mjs";
import { stopSignal } from "./session.mjs";

const outputKept = 200_000;
const soon = { signal: "SIGTERM", patienceMs: 5_000 };
/** Signal 0 only looks: what must not be cut in half is waited for. */
const uncut = { signal: 0, patienceMs: 600_000 };

/**
 * Runs a tool to its end and answers with what it printed. A tool has a process group of its own: Ctrl-C reaches only
 * the launcher, which ends things in their order.
 */
export async function runTool(
  title,
  command,
  { interruptible = true, input, onOutput, env = process.env, ...rest } = {},
) {
  if (interruptible) stopSignal.throwIfAborted();
  // What a tool says is searched for known causes, so it says it in English.
  const english = { ...env, LC_ALL: "C.UTF-8" };
  const service = startService(command, { ...rest, env: english, ending: interruptible ? soon : uncut });
  service.feed(input);
  if (onOutput) service.pass(onOutput);
  if (interruptible) stopSignal.addEventListener("abort", service.stop, { once: true });
  const result = await service.ended;
  stopSignal.removeEventListener("abort", service.stop);
  if (interruptible && stopSignal.aborted) {
    await service.stop();
    throw stopSignal.reason;
  }
  if (result.error) throw result.error;
  if (result.code !== 0) throw new ToolFailure(title, { ...result, output: service.output() });
  return service.printed();
}

/** Starts a process that goes on; whoever starts it stops it. */
export function startService([command, ...args], { ending = soon, account, ...options }) {
  const settings = { cwd: projectFolder, stdio: "pipe", ...options, ...account, detached: true };
  const child = spawn(command, args, settings);
  if (child.pid) guardGroup(child.pid, ending);
  const kept = keepOutput(child);
  return {
    ...kept,
    ended: endOf(child),
    stop: () => child.pid && stopGroup(child.pid, ending),
    feed(input) {
      child.stdin.on("error", () => {});
      child.stdin.end(input);
    },
  };
}

async function endOf(child) {
  const result = await new Promise((resolve) => {
    child.on("error", (error) => resolve({ error }));
    child.on("close", (code, signal) => resolve({ code, signal }));
  });
  if (child.pid) forgetGroup(child.pid);
  return result;
}

function keepOutput({ stdout, stderr }) {
  let output = "";
  let printed = "";
  let listener;
  stdout?.setEncoding("utf8").on("data", (text) => {
    printed = (printed + text).slice(-outputKept);
  });
  for (const stream of [stdout, stderr])
    stream?.setEncoding("utf8").on("data", (text) => {
      output = (output + text).slice(-outputKept);
      listener?.(text);
    });
  return {
    output: () => output,
    printed: () => printed,
    pass(to) {
      listener = to;
    },
  };
}
