"use client";
import { createContext, useContext } from "react";
import type { FormReply } from "./reply";

/** What conform tells of one field; the inputs need no more. */
export type FormField = {
  key: string | undefined;
  id: string;
  name: string;
  errors: string[] | undefined;
  defaultValue: string | undefined;
  defaultOptions: string[] | undefined;
  defaultChecked: boolean | undefined;
  /** The fields of a field that is a group. */
  getFieldset?: () => object;
};

export type FormState = {
  id: string;
  pending: boolean;
  reply: FormReply | undefined;
  fieldOf: (name: string) => FormField | undefined;
};

export const FormContext = createContext<FormState | null>(null);

/** The form around this part; null when it stands alone. */
export function useFormState(): FormState | null {
  return useContext(FormContext);
}
