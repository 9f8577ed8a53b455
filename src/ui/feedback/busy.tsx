import type { ReactNode } from "react";
import { Spinner } from "./spinner";

/** Stands where something will be: says what is being done. */
export function Busy({ children = "Loading" }: { children?: ReactNode }) {
  return (
    <p role="status" className="inline-flex items-center gap-2 text-ink-2">
      <Spinner />
      {children}
    </p>
  );
}
