"use client";
import { Undo2, X } from "lucide-react";
import type { ReactNode } from "react";
import { buttonStyle } from "../button-style";

type Props = {
  /** What was done: "12 readings pasted". Nothing is shown while it is null. */
  message: ReactNode | null;
  onUndo: () => void;
  onDismiss: () => void;
  undoLabel?: string;
};

/** Says what was just done, in its place on the page, with the way back. It stays until it is dismissed. */
export function UndoBar({ message, onUndo, onDismiss, undoLabel = "Undo" }: Props) {
  return (
    <div role="status">
      {message === null ? null : (
        <div className="flex flex-wrap items-center gap-x-3 gap-y-1 border-l-[3px] border-ink bg-raised px-3 py-1.5 text-small">
          <span className="min-w-0 flex-1">{message}</span>
          <button type="button" onClick={onUndo} className={buttonStyle("plain", "small")}>
            <Undo2 aria-hidden="true" size={14} />
            {undoLabel}
          </button>
          <button type="button" onClick={onDismiss} className={buttonStyle("quiet", "small")}>
            <X aria-hidden="true" size={14} />
            <span className="sr-only">Dismiss</span>
          </button>
        </div>
      )}
    </div>
  );
}
