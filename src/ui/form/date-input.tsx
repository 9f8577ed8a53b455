"use client";
import { TextInput, type TextInputProps } from "./text-input";

/** A day; the browser shows it the reader's way and sends it as 2026-03-14. */
export function DateInput(props: Omit<TextInputProps, "type">) {
  return <TextInput {...props} type="date" />;
}
