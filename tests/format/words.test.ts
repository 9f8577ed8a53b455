import { expect, test } from "vitest";
import { formatBytes } from "@/format/format-bytes";
import { formatDuration } from "@/format/format-duration";
import { joinWords } from "@/format/join-words";
import { plural } from "@/format/plural";

test.each([
  [0, "0 B"],
  [980, "980 B"],
  [999.6, "1 kB"],
  [1_449_000, "1.4 MB"],
  [9_960_000, "10 MB"],
  [25_000_000, "25 MB"],
  [999_600_000, "1 GB"],
  [5e15, "5000 TB"],
])("%s bytes: %s", (bytes, text) => expect(formatBytes(bytes)).toBe(text));

test.each([
  [-5, "0 s"],
  [45_000, "45 s"],
  [59_700, "1 min"],
  [12 * 60_000, "12 min"],
  [59.6 * 60_000, "1 h"],
  [90 * 60_000, "1 h 30 min"],
  [3 * 86_400_000, "3 days"],
])("%s ms: %s", (milliseconds, text) => expect(formatDuration(milliseconds)).toBe(text));

test.each([
  [[], ""],
  [["a"], "a"],
  [["a", "b"], "a and b"],
  [["a", "b", "c"], "a, b and c"],
])("%j: %s", (words, text) => expect(joinWords(words)).toBe(text));

test.each([
  [1, "day", "1 day"],
  [0, "injector", "0 injectors"],
  [2, "entry", "2 entries"],
  [2, "day", "2 days"],
  [3, "batch", "3 batches"],
  [2, "class", "2 classes"],
])("%s %s: %s", (count, word, text) => expect(plural(count, word)).toBe(text));

test("words that bend otherwise are given", () => expect(plural(2, "person", "people")).toBe("2 people"));
