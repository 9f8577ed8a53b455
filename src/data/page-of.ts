import "server-only";
import type { z } from "zod";
import type { page } from "./fields";

const mostRows = 100;

/** What a list's query skips and takes; no list answers more than a hundred rows at once. */
export function pageOf({ startRow, endRow }: z.output<typeof page>) {
  return { offset: startRow, limit: Math.min(mostRows, Math.max(1, endRow - startRow)) };
}
