import type { StatusKind } from "./status-mark-kind";

/** Each kind has a shape of its own; conditional ones are hollow. */
const shapes: Record<StatusKind, { d: string; hollow?: boolean }> = {
  pass: { d: "M5 0.5a4.5 4.5 0 1 1 0 9a4.5 4.5 0 1 1 0-9z" },
  "conditional pass": { d: "M5 1.2a3.8 3.8 0 1 1 0 7.6a3.8 3.8 0 1 1 0-7.6z", hollow: true },
  "conditional fail": { d: "M1.4 1.4h7.2v7.2h-7.2z", hollow: true },
  fail: { d: "M0.8 0.8h8.4v8.4h-8.4z" },
  held: { d: "M1.2 0.8h2.8v8.4h-2.8zM6 0.8h2.8v8.4h-2.8z" },
  late: { d: "M5 0.6l4.7 8.6h-9.4z" },
  due: { d: "M5 1.8l3.8 6.9h-7.6z", hollow: true },
  neutral: { d: "M1 4.2h8v1.6h-8z" },
};

export function StatusShape({ kind }: { kind: StatusKind }) {
  const { d, hollow } = shapes[kind];
  return (
    <svg aria-hidden="true" focusable="false" width="9" height="9" viewBox="0 0 10 10" className="shrink-0">
      <path
        d={d}
        fill={hollow ? "none" : "currentColor"}
        stroke={hollow ? "currentColor" : "none"}
        strokeWidth="1.6"
      />
    </svg>
  );
}
