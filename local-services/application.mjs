import { setTimeout as pause } from "node:timers/promises";
import { nextProgram } from "./build.mjs";
import { ToolFailure } from "./failure.mjs";
import { startService } from "./processes.mjs";
import { atEnd, stopSignal } from "./session.mjs";

const readyWithinMs = 90_000;
const drain = { signal: "SIGTERM", patienceMs: 20_000 };

/**
 * Starts the framework's server and answers when the application says that it is ready. SIGTERM lets requests finish;
 * what is not done after the drain is cut.
 */
export async function serve(verb, port, env) {
  const command = [process.execPath, nextProgram, verb, "-H", "127.0.0.1", "-p", String(port)];
  const service = startService(command, { env: { ...env, NEXT_TELEMETRY_DISABLED: "1" }, ending: drain });
  atEnd(service.stop);
  await Promise.race([untilReady(port), failure(service)]);
  return service;
}

/** Rejects when the server ends by itself. */
export async function failure(service) {
  const result = await service.ended;
  if (stopSignal.aborted) throw stopSignal.reason;
  throw result.error ?? new ToolFailure("The application", { ...result, output: service.output() });
}

async function untilReady(port) {
  for (const deadline = Date.now() + readyWithinMs; Date.now() < deadline; await pause(200)) {
    stopSignal.throwIfAborted();
    if (await isReady(port)) return;
  }
  throw new Error(`The application did not become ready within ${readyWithinMs / 1000} s.`);
}

async function isReady(port) {
  try {
    const answer = await fetch(`http://127.0.0.1:${port}/api/health/ready`, {
      signal: AbortSignal.any([stopSignal, AbortSignal.timeout(10_000)]),
    });
    return answer.ok;
  } catch {
    return false;
  }
}
