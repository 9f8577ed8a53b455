import { commonWords } from "./common-words";

const shortest = 15;
const longest = 1000;
/** Signs that are left once everything easily guessed is taken away. */
const leastLeft = 8;

/**
 * What is wrong with a new password, or null. Length alone counts (NIST SP 800-63B-4, 3.1.1.2), yet not the length
 * that comes from repeating, from running along a row, or from words that anybody would try on this lab.
 */
export function passwordProblem(password: string, ownWords: readonly string[]): string | null {
  const length = [...password].length;
  if (length < shortest)
    return `Password has at least ${shortest} characters; this one has ${length}. A few unrelated words do well.`;
  if (length > longest) return `Password has at most ${longest} characters.`;
  const plain = password.normalize("NFKC").toLowerCase();
  if (isRepeated(plain) || unguessed(plain) < leastLeft)
    return "Password repeats itself or runs along a row of letters or numbers. Please choose something less regular.";
  const { found, rest } = takeWordsAway(plain, ownWords);
  if (unguessed(rest) < leastLeft)
    return `Password is little more than “${found.join("”, “")}”, which is easily guessed here. Please add unrelated words.`;
  return null;
}

/** The whole is one piece over and over: its own border is at least half as long as it is. */
function isRepeated(text: string): boolean {
  const borders = [0];
  for (let index = 1, border = 0; index < text.length; index++) {
    while (border > 0 && text[index] !== text[border]) border = borders[border - 1]!;
    if (text[index] === text[border]) border += 1;
    borders.push(border);
  }
  return text.length >= 2 * (text.length - borders[text.length - 1]!);
}

const rows = [
  "abcdefghijklmnopqrstuvwxyz",
  "01234567890",
  "qwertyuiop",
  "qwertzuiop",
  "asdfghjkl",
  "zxcvbnm",
];
const steps = new Set(
  rows.flatMap((row) => [...row].slice(1).flatMap((sign, index) => [row[index]! + sign, sign + row[index]!])),
);

/** Signs that do not follow from the one before. */
function unguessed(text: string): number {
  const signs = [...text.replace(/\s/gu, "")];
  return signs.filter((sign, index) => {
    const before = signs[index - 1] ?? "";
    return sign !== before && !steps.has(before + sign);
  }).length;
}

/** The longest words first, so that “injectors” is not found as “injector” and an s. */
function takeWordsAway(plain: string, ownWords: readonly string[]): { found: string[]; rest: string } {
  const own = ownWords.flatMap((words) =>
    words
      .normalize("NFKC")
      .toLowerCase()
      .split(/[^\p{L}\p{N}]+/u),
  );
  const known = [...new Set([...own.filter((word) => [...word].length >= 3), ...commonWords])];
  const found: string[] = [];
  let rest = plain;
  for (const word of known.sort((a, b) => b.length - a.length)) {
    if (!rest.includes(word)) continue;
    found.push(word);
    rest = rest.replaceAll(word, " ");
  }
  return { found, rest };
}
