"use client";
import { useSyncExternalStore } from "react";

const query = "(width < 48rem)";

function subscribe(changed: () => void) {
  const media = matchMedia(query);
  media.addEventListener("change", changed);
  return () => media.removeEventListener("change", changed);
}

/** Whether cards fit better than a grid; null while that is not known, on the server. */
export function useIsPhone(): boolean | null {
  return useSyncExternalStore<boolean | null>(
    subscribe,
    () => matchMedia(query).matches,
    () => null,
  );
}
