import "server-only";
import { readFileSync } from "node:fs";
import path from "node:path";
import { unpackWoff } from "./unpack-woff";

export const weights = [400, 500, 600] as const;
export type Weight = (typeof weights)[number];

/** Each file holds one script; the first that has a sign draws it. */
export const scripts = ["latin", "latin-ext", "greek", "cyrillic", "cyrillic-ext", "vietnamese"] as const;
export type Script = (typeof scripts)[number];

const folder = "node_modules/@fontsource/ibm-plex-sans/files";

export function readFontFile(script: Script, weight: Weight): Buffer {
  const file = `ibm-plex-sans-${script}-${weight}-normal.woff`;
  return unpackWoff(readFileSync(path.join(/* turbopackIgnore: true */ process.cwd(), folder, file)));
}
