import { readFileSync } from "node:fs";

type File = { cases: { id: string }[] };

/** One case of a file in tests/published; its shape is for the test to say. */
export function publishedCase<Case>(file: string, id: string): Case {
  const text = readFileSync(new URL(`../published/${file}.json`, import.meta.url), "utf8");
  const found = (JSON.parse(text) as File).cases.find((candidate) => candidate.id === id);
  if (!found) throw new Error(`tests/published/${file}.json has no case ${id}`);
  return found as Case;
}
