"use client";
import { createContext, useContext } from "react";
import type { DraftFields } from "../../../data/cycles/draft-fields";
import type { DraftConflict } from "../../../data/cycles/sheet/merge-changes";
import type { Edit } from "../draft/draft-state";

/** What every control of the sheet reads and does. */
export type SheetHands = {
  fields: DraftFields;
  conflicts: Record<string, DraftConflict>;
  readOnly: boolean;
  edit: (edits: Edit[]) => void;
  choose: (field: string, whose: "theirs" | "yours") => void;
};

export const SheetContext = createContext<SheetHands | null>(null);

export function useSheet(): SheetHands {
  const hands = useContext(SheetContext);
  if (!hands) throw new Error("a control of the sheet stands outside of it");
  return hands;
}
