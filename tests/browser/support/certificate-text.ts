import { execFileSync } from "node:child_process";
import { expect } from "@playwright/test";

/** What stands on the certificate, as pdftotext reads it. */
export function textOf(pdf: string): string {
  return execFileSync("pdftotext", ["-layout", pdf, "-"], { encoding: "utf8" });
}

/** The numbers of one injector in the table below a heading: as found in the row of its tag, as left in that of its serial. */
export function rowsOf(text: string, heading: string, injector: { tag: string; serial: string }) {
  const table = text.slice(text.indexOf(`\n${heading}`));
  expect(table.length, `the certificate has a table ${heading}`).toBeGreaterThan(1);
  const numbersBehind = (name: string) => {
    const line = table.split("\n").find((candidate) => candidate.startsWith(`${name} `));
    expect(line, `${heading} has a row of ${name}`).toBeDefined();
    return numbersIn(line!.slice(name.length));
  };
  return { found: numbersBehind(injector.tag), left: numbersBehind(injector.serial) };
}

/** Pairs as found and as left that stand above and below the name of a row. */
export function pairBeside(text: string, name: string) {
  const lines = text.split("\n").filter((line) => line.trim() !== "");
  const at = lines.findIndex((line) => line.trimStart().startsWith(name));
  expect(at, `the certificate has a row ${name}`).toBeGreaterThan(0);
  return { found: numbersIn(lines[at - 1]!), left: numbersIn(lines[at + 1]!) };
}

function numbersIn(line: string): number[] {
  return (line.match(/[−-]?\d+(?:\.\d+)?/g) ?? []).map((digits) => Number(digits.replace("−", "-")));
}

/** A printed figure is the expected one, rounded; a figure that lies on the edge may be rounded either way. */
export function expectPrinted(printed: number | undefined, expected: number, decimals: number, what: string) {
  expect(printed, `${what} is printed`).toBeDefined();
  const allowed = 0.5 * 10 ** -decimals * 1.02;
  expect(Math.abs(printed! - expected), `${what}: printed ${printed}, expected ${expected}`).toBeLessThan(
    allowed,
  );
}
