import { explain, lastLines, Stopped, ToolFailure } from "./failure.mjs";
import { dismissGuardian, startGuardian } from "./guard.mjs";
import { processFields } from "./process-identity.mjs";
import { complain } from "./terminal.mjs";

const stopping = new AbortController();
const endings = [];
const exitCodes = { SIGHUP: 129, SIGINT: 130, SIGTERM: 143 };

/** Aborts when the person, or whoever started this, wants the end. */
export const stopSignal = stopping.signal;

/** Runs at the end, the newest first, whatever the end was. */
export function atEnd(ending) {
  endings.push(ending);
}

/** Resolves when the person ends a run that was going well. */
export async function untilStopped() {
  if (!stopSignal.aborted)
    await new Promise((resolve) => stopSignal.addEventListener("abort", resolve, { once: true }));
  if (!(stopSignal.reason instanceof Stopped)) throw stopSignal.reason;
}

/** The frame of every command here: `body` answers with the exit code. */
export async function runSession(body) {
  for (const signal of Object.keys(exitCodes)) process.on(signal, () => stopping.abort(new Stopped(signal)));
  // A terminal that is gone must not keep the clean-up from running.
  for (const stream of [process.stdout, process.stderr]) stream.on("error", () => {});
  process.on("uncaughtException", (error) => stopping.abort(error));
  process.on("unhandledRejection", (error) => stopping.abort(error));
  stopWhenOrphaned();
  startGuardian();
  let code = await attempt(body);
  for (const ending of endings.reverse()) code = (await attempt(ending)) || code;
  await dismissGuardian();
  process.exit(code);
}

async function attempt(work) {
  try {
    return (await work()) ?? 0;
  } catch (error) {
    if (error instanceof Stopped) return exitCodes[error.signal];
    report(error);
    return 1;
  }
}

function report(error) {
  const sentence = explain(error);
  if (sentence) complain(`\n${sentence}`);
  else if (error instanceof ToolFailure) complain(`\n${lastLines(error.output)}\n\n${error.message}.`);
  else complain(`\n${error.stack ?? error}`);
}

/** npm killed outright tells nobody; its child is then somebody else's. */
function stopWhenOrphaned() {
  if (!process.env.npm_lifecycle_event) return;
  const ancestors = [process.ppid, parentOf(process.ppid)].filter(Boolean);
  const watch = setInterval(() => {
    if (process.ppid !== ancestors[0] || (ancestors[1] && parentOf(ancestors[0]) !== ancestors[1]))
      stopping.abort(new Stopped("SIGHUP"));
  }, 1_000);
  watch.unref();
}

function parentOf(pid) {
  const parent = Number(processFields(pid)?.[1]);
  return parent > 1 ? parent : undefined;
}
