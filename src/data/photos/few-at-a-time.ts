import "server-only";
import { busy } from "../access/errors";

const mostRunning = 2;
const mostWaiting = 12;
let running = 0;
const waiting: (() => void)[] = [];

/** Decoding takes processor and memory: two at a time, a dozen in line, and whoever comes then is asked to come again. */
export async function fewAtATime<Result>(work: () => Promise<Result>): Promise<Result> {
  if (running >= mostRunning) {
    if (waiting.length >= mostWaiting) throw busy("Many photos are coming in just now. Please try again.", 5);
    await new Promise<void>((resolve) => waiting.push(resolve));
  } else running += 1;
  try {
    return await work();
  } finally {
    // The place is handed on to the next in line, or given up.
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  }
}
