import { mm } from "../drawing/print-style";

/** Labels from a roll are a page each; on a sheet several share one, with room to cut. */
export const labelLayouts = {
  "62x29": { page: { width: mm(62), height: mm(29) }, label: { width: mm(62), height: mm(29) }, margin: 0 },
  "100x50": {
    page: { width: mm(100), height: mm(50) },
    label: { width: mm(100), height: mm(50) },
    margin: 0,
  },
  a4: { page: { width: mm(210), height: mm(297) }, label: { width: mm(63), height: mm(38) }, margin: mm(9) },
  letter: { page: { width: 612, height: 792 }, label: { width: mm(63), height: mm(38) }, margin: mm(9) },
} as const;

export type LabelSize = keyof typeof labelLayouts;
