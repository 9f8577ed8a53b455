"use client";
import { injectorOf } from "../../../data/cycles/draft-fields";
import { describeField } from "../../../data/cycles/sheet/describe-field";
import type { Sheet } from "../../../data/cycles/sheet/types";
import { ConflictChoice } from "./conflict-choice";
import { useSheet } from "./sheet-context";

/** Cells that two technicians typed in, each with both texts and the choice. */
export function GridConflicts({ sheet }: { sheet: Sheet }) {
  const { conflicts } = useSheet();
  return Object.keys(conflicts)
    .filter((field) => injectorOf(field) !== null || field.startsWith("column."))
    .map((field) => <ConflictChoice key={field} field={field} name={describeField(field, sheet)} />);
}
