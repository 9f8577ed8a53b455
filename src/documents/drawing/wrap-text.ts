import "server-only";

type Measure = (text: string) => number;

/** Text in lines no wider than `width`: broken at blanks, and inside a word only where the word alone is too wide. */
export function wrapText(text: string, width: number, measure: Measure): string[] {
  return text.split("\n").flatMap((paragraph) => wrapParagraph(paragraph, width, measure));
}

function wrapParagraph(paragraph: string, width: number, measure: Measure): string[] {
  const lines: string[] = [];
  let line: string | null = null;
  for (const word of paragraph.split(" ")) {
    const longer: string = line === null ? word : `${line} ${word}`;
    if (measure(longer) <= width) {
      line = longer;
      continue;
    }
    if (line !== null) lines.push(line);
    const pieces = breakWord(word, width, measure);
    lines.push(...pieces.slice(0, -1));
    line = pieces.at(-1)!;
  }
  return [...lines, line ?? ""];
}

function breakWord(word: string, width: number, measure: Measure): string[] {
  if (measure(word) <= width) return [word];
  const pieces: string[] = [""];
  // Accents stay with the letter that carries them.
  for (const sign of word.match(/\P{M}\p{M}*|\p{M}+/gu) ?? []) {
    const longer = pieces.at(-1)! + sign;
    if (pieces.at(-1) === "" || measure(longer) <= width) pieces[pieces.length - 1] = longer;
    else pieces.push(sign);
  }
  return pieces;
}
