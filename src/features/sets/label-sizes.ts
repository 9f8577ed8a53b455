/** The sizes that bag labels come in. */
export const labelSizes = [
  { size: "62x29", label: "Roll, 62 × 29 mm" },
  { size: "100x50", label: "Roll, 100 × 50 mm" },
  { size: "a4", label: "Sheet, A4" },
  { size: "letter", label: "Sheet, Letter" },
] as const;
