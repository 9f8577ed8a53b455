import { Check, CloudOff, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { classNames } from "../class-names";
import { Spinner } from "./spinner";

export type SaveStateValue =
  | { state: "idle" }
  | { state: "saving" }
  /** The time as it is shown, such as 10:42:03. */
  | { state: "saved"; at: string }
  /** The server did not take it; it is kept here and sent again. */
  | { state: "not saved"; waiting?: number }
  | { state: "offline"; waiting?: number };

/** Whether what was typed has reached the server. Changes are read out politely. */
export function SaveState({ value, action }: { value: SaveStateValue; action?: ReactNode }) {
  const { icon, ink, text } = lookOf(value);
  return (
    <span className="inline-flex items-center gap-2">
      <span role="status" className={classNames("inline-flex items-center gap-1.5 text-small", ink)}>
        {icon}
        <span>{text}</span>
      </span>
      {action}
    </span>
  );
}

function lookOf(value: SaveStateValue): { icon: ReactNode; ink: string; text: string } {
  if (value.state === "idle") return { icon: null, ink: "text-ink-2", text: "" };
  if (value.state === "saving") return { icon: <Spinner />, ink: "text-ink-2", text: "saving" };
  if (value.state === "saved")
    return { icon: <Check aria-hidden="true" size={14} />, ink: "text-ink-2", text: `saved ${value.at}` };
  const waiting = value.waiting ? `, ${value.waiting} waiting` : "";
  if (value.state === "offline") {
    const text = `offline: kept on this device${waiting}`;
    return { icon: <CloudOff aria-hidden="true" size={14} />, ink: "text-held font-medium", text };
  }
  const text = `not saved: kept on this device${waiting}`;
  return { icon: <TriangleAlert aria-hidden="true" size={14} />, ink: "text-out font-medium", text };
}
