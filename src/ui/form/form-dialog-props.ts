import type { ReactNode } from "react";
import type { z } from "zod";
import type { ButtonKind, ButtonSize } from "../button-style";
import type { FormAction, FormReply } from "./reply";

export type FormDialogProps = {
  /** Words on the button that opens it. */
  trigger: ReactNode;
  triggerKind?: ButtonKind;
  triggerSize?: ButtonSize;
  /** Names the thing: "Put set 26-0147 on hold". */
  title: string;
  description?: ReactNode;
  action: FormAction;
  schema?: z.ZodType;
  /** Ids and versions that go along. */
  fields?: Record<string, string | number>;
  submitLabel: ReactNode;
  submitKind?: ButtonKind;
  busyLabel?: ReactNode;
  cancelLabel?: ReactNode;
  onDone?: (reply: FormReply) => void;
  /** Inputs, found by their `name`. */
  children?: ReactNode;
};
