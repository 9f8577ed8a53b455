"use client";
import { useState } from "react";
import { problemOf } from "../../../data/cycles/draft-fields";
import { NumberInput } from "../../../ui/form/number-input";
import { TextInput } from "../../../ui/form/text-input";
import { useSheet } from "./sheet-context";

type Props = {
  label: string;
  field: string;
  /** Numbers have one. */
  unit?: string;
  hint?: string;
  /** What recording found missing here. */
  missing?: string;
  className?: string;
};

/** A field of the sheet outside the grid. What is wrong is said when the field is left, not while it is typed. */
export function SheetInput({ label, field, unit, hint, missing, className }: Props) {
  const { fields, readOnly, edit } = useSheet();
  const [typing, setTyping] = useState(false);
  const text = fields[field] ?? "";
  const problem = typing ? null : (problemOf(field, text) ?? (text.trim() === "" ? missing : null));
  const shared = {
    label,
    hint,
    className,
    readOnly,
    value: text,
    errors: problem ? [problem] : undefined,
    maxLength: unit ? 24 : 2000,
    onFocus: () => setTyping(true),
    onBlur: () => setTyping(false),
    onChange: (event: { target: { value: string } }) => edit([{ field, value: event.target.value }]),
  };
  return unit ? <NumberInput {...shared} unit={unit} /> : <TextInput {...shared} />;
}
