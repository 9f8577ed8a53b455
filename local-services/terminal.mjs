import { Stopped } from "./failure.mjs";

const rewritesLines = process.stdout.isTTY === true;
const heartbeatMs = rewritesLines ? 1_000 : 20_000;
const titleWidth = 14;

export function say(line = "") {
  process.stdout.write(`${line}\n`);
}

export function complain(text) {
  process.stderr.write(`${text}\n`);
}

export function duration(ms) {
  if (ms < 9_950) return `${(ms / 1000).toFixed(1)} s`;
  const seconds = Math.round(ms / 1000);
  return seconds < 60 ? `${seconds} s` : `${Math.floor(seconds / 60)} min ${seconds % 60} s`;
}

/** One line for a step of the set-up: what it is, how long it has been going, what came of it. */
export async function step(title, work, summarise = String) {
  const startedAt = performance.now();
  let doing = "…";
  function draw(text, last) {
    const line = `  ${title.padEnd(titleWidth)}${text}`;
    if (rewritesLines) process.stdout.write(`\r\x1b[2K${line}${last ? "\n" : ""}`);
    else say(line);
  }
  const elapsed = () => duration(performance.now() - startedAt);
  const heartbeat = setInterval(() => draw(`${doing} ${elapsed()}`), heartbeatMs);
  if (rewritesLines) draw(doing);
  try {
    const result = await work((text) => {
      doing = `${text} …`;
    });
    draw(`${summarise(result)} (${elapsed()})`, true);
    return result;
  } catch (error) {
    draw(`${error instanceof Stopped ? "stopped" : "failed"} (${elapsed()})`, true);
    throw error;
  } finally {
    clearInterval(heartbeat);
  }
}

export function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)));
  return rows.map((row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column]))
      .join("   ")
      .trimEnd(),
  );
}
