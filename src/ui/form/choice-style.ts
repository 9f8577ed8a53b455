/** A tick or a dot with its words, large enough to tap. */
export const choiceStyle =
  "touch-target flex items-center gap-2 rounded-control py-1 has-disabled:cursor-not-allowed has-disabled:text-ink-2";
export const tickStyle = "size-4 shrink-0 pointer-coarse:size-5";
