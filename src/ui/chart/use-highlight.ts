"use client";
import { useState } from "react";

export type Highlight = {
  /** Which series stands out; null for none. */
  highlighted?: string | null;
  onHighlight?: (key: string | null) => void;
};

/** The page may say which series stands out, or leave it to the chart. */
export function useHighlight({ highlighted, onHighlight }: Highlight) {
  const [own, setOwn] = useState<string | null>(null);
  const current = highlighted === undefined ? own : highlighted;
  function choose(key: string | null) {
    setOwn(key);
    onHighlight?.(key);
  }
  return [current, choose] as const;
}
