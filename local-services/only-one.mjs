import { Refusal } from "./failure.mjs";
import { holderOf, takeLock } from "./lock.mjs";
import { localFile, makeLocalFolder } from "./project.mjs";
import { atEnd } from "./session.mjs";

/** Refuses a second run of a command in this project; `about` is what a second one is told about the first. */
export async function onlyOne(command, about, sentence) {
  makeLocalFolder();
  const whenHeld = (first) => {
    throw new Refusal(sentence(first));
  };
  const lock = await takeLock(lockFile(command), { about, whenHeld });
  atEnd(lock.release);
}

/** What the running command says about itself, or undefined when it does not run. */
export function running(command) {
  return holderOf(lockFile(command));
}

function lockFile(command) {
  return localFile(`${command}.lock`);
}
