/** Said to the person as it stands: one sentence, no stack. */
export class Refusal extends Error {}

/** The person asked for the end (Ctrl-C, SIGTERM, SIGHUP). */
export class Stopped extends Error {
  constructor(signal) {
    super(`stopped by ${signal}`);
    this.signal = signal;
  }
}

/** A tool that ended badly, with what it printed. */
export class ToolFailure extends Error {
  constructor(title, { code, signal, output }) {
    super(`${title} ended with ${signal ?? `exit code ${code}`}`);
    this.output = output;
  }
}

const diskFull = /ENOSPC|EDQUOT|No space left on device|Disk quota exceeded/i;

/** The sentence for a failure whose cause is known, or undefined. */
export function explain(error) {
  if (error instanceof Refusal) return error.message;
  const text = `${error.code ?? ""} ${error.output ?? error.message}`;
  if (diskFull.test(text)) return "The disk is full: free some space, then run the same command again.";
  if (/^(EACCES|EPERM|EROFS)$/.test(error.code ?? "") && error.path)
    return `This user may not write ${error.path}: run as the user who owns the project's folder.`;
  return undefined;
}

const linesShown = 30;

export function lastLines(output) {
  return output.trimEnd().split("\n").slice(-linesShown).join("\n");
}
