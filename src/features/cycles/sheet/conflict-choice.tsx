"use client";
import { buttonStyle } from "../../../ui/button-style";
import { useSheet } from "./sheet-context";

/** Both texts of a field that two people typed in, and the choice between them. */
export function ConflictChoice({ field, name }: { field: string; name: string }) {
  const { conflicts, choose } = useSheet();
  const conflict = conflicts[field];
  if (!conflict) return null;
  return (
    <div
      role="alert"
      className="flex flex-wrap items-center gap-x-3 gap-y-1.5 bg-out-soft px-3 py-2 text-small"
    >
      <span>
        <span className="font-medium">{name}</span>: somebody else typed{" "}
        <strong>{conflict.theirs || "nothing"}</strong>, you typed{" "}
        <strong>{conflict.yours || "nothing"}</strong>.
      </span>
      <span className="flex gap-2">
        <button
          type="button"
          className={buttonStyle("plain", "small")}
          onClick={() => choose(field, "theirs")}
        >
          Take theirs
        </button>
        <button
          type="button"
          className={buttonStyle("plain", "small")}
          onClick={() => choose(field, "yours")}
        >
          Keep mine
        </button>
      </span>
    </div>
  );
}
