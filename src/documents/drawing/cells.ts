import "server-only";
import type { MarkKind } from "./marks";
import { styles } from "./print-style";
import type { Cell } from "./table-spec";

/** As found above in quiet type, as left below in strong. */
export function foundAndLeft(found: string, left: string): Cell {
  return [
    { text: found, style: styles.found },
    { text: left, style: styles.figure },
  ];
}

export function words(text: string): Cell {
  return [{ text, style: styles.body }];
}

export function quietWords(text: string): Cell {
  return [{ text, style: styles.found }];
}

export function figure(text: string): Cell {
  return [{ text, style: styles.figure }];
}

/** A main line and what is said of it below. */
export function withNote(text: string, note: string): Cell {
  const main = { text, style: styles.figure };
  return note === "" ? [main] : [main, { text: note, style: styles.small }];
}

export function marked(text: string, mark: MarkKind): Cell {
  return [{ text, style: styles.bodyStrong, mark }];
}
