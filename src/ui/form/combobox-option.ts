import type { ReactNode } from "react";

export type ComboboxOption = {
  value: string;
  label: string;
  /** Small words after the label that tell likenesses apart. */
  note?: ReactNode;
};
