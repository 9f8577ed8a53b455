export type StatusKind =
  | "pass"
  | "conditional pass"
  | "conditional fail"
  | "fail"
  | "held"
  | "late"
  | "due"
  | "neutral";
