import type { ReactNode } from "react";
import { classNames } from "../class-names";

export type Fact = { label: ReactNode; value: ReactNode };

/** Names and values in two columns; values stand at the right, or at the left for words. */
export function Facts({ facts, align = "right" }: { facts: readonly Fact[]; align?: "left" | "right" }) {
  return (
    <dl className="flex flex-col gap-[3px]">
      {facts.map(({ label, value }, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: facts have a fixed order and no identity
        <div key={index} className={classNames("flex gap-3.5", align === "right" && "justify-between")}>
          <dt className={classNames("text-ink-2", align === "left" && "w-32 shrink-0")}>{label}</dt>
          <dd
            className={classNames("min-w-0 font-medium wrap-break-word", align === "right" && "text-right")}
          >
            {value}
          </dd>
        </div>
      ))}
    </dl>
  );
}
