import { statfsSync } from "node:fs";
import { Refusal } from "./failure.mjs";
import { projectFolder } from "./project.mjs";

const neededGigabytes = 1.5;

/** Packages and a build need room; a disk that fills up halfway would say so less clearly. */
export function requireSpace() {
  const { bavail, bsize } = statfsSync(projectFolder);
  const free = (bavail * bsize) / 1e9;
  if (free < neededGigabytes)
    throw new Refusal(
      `The disk is nearly full: ${free.toFixed(1)} GB free below ${projectFolder}, ${neededGigabytes} GB needed. Free some space, then run this again.`,
    );
}
