import { sprayGrades } from "../../../db/vocabulary";

/** The first letters of a grade are enough: "g" is good. What fits none stays as typed. */
export function expandGrade(typed: string): string {
  const text = typed.trim().toLowerCase();
  const fitting = text === "" ? [] : sprayGrades.filter((grade) => grade.startsWith(text));
  return fitting.length === 1 ? fitting[0]! : typed;
}
