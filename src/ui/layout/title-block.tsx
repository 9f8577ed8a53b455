import type { ReactNode } from "react";
import { classNames } from "../class-names";

export type TitleCell = {
  label: ReactNode;
  value: ReactNode;
  /** Share of the width against the other cells. */
  weight?: number;
  tone?: "plain" | "petrol" | "out" | "held";
};

const tones = { plain: "", petrol: "text-petrol", out: "text-out", held: "text-held" };

/** The key facts of a thing in one row of cells, as on a drawing. Put a CourseStrip inside to close it. */
export function TitleBlock({ cells, children }: { cells: readonly TitleCell[]; children?: ReactNode }) {
  return (
    <section className="overflow-hidden rounded-sheet border border-hair bg-sheet">
      <dl className="-mt-px -ml-px flex flex-wrap">
        {cells.map(({ label, value, weight = 1, tone = "plain" }, index) => (
          <div
            // biome-ignore lint/suspicious/noArrayIndexKey: cells have a fixed order and no identity
            key={index}
            style={{ flexGrow: weight, flexBasis: `${Math.round(7 + weight * 2)}rem` }}
            className="min-w-0 border-t border-l border-hair-2 px-3.5 py-[9px]"
          >
            <dt className="text-key text-ink-2">{label}</dt>
            <dd className={classNames("font-medium wrap-break-word", tones[tone])}>{value}</dd>
          </div>
        ))}
      </dl>
      {children}
    </section>
  );
}
