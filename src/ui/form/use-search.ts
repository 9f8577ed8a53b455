"use client";
import { useEffect, useEffectEvent, useRef, useState } from "react";
import type { ComboboxOption } from "./combobox-option";

export type Search = (query: string) => Promise<ComboboxOption[]>;

const pauseMs = 180;

type Found = { query: string; options: ComboboxOption[]; failed: boolean };

/** Searches as the query changes: after a short pause, and an answer that was overtaken is dropped. */
export function useSearch(query: string, search: Search, active: boolean) {
  const [found, setFound] = useState<Found | null>(null);
  const newest = useRef(0);
  const ask = useEffectEvent(search);

  useEffect(() => {
    if (!active) return;
    const mine = ++newest.current;
    const timer = setTimeout(async () => {
      const answer = await ask(query).then(
        (options) => ({ query, options, failed: false }),
        () => ({ query, options: [], failed: true }),
      );
      if (mine === newest.current) setFound(answer);
    }, pauseMs);
    return () => clearTimeout(timer);
  }, [query, active]);

  const settled = found?.query === query;
  return {
    options: found?.options ?? [],
    failed: settled && (found?.failed ?? false),
    searching: active && !settled,
  };
}
