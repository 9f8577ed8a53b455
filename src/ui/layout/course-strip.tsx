import { Check, Pause } from "lucide-react";
import type { ReactNode } from "react";
import { classNames } from "../class-names";

export type CourseStep = {
  label: ReactNode;
  state: "done" | "now" | "next";
  /** Who and when, in small words. */
  note?: ReactNode;
};

type Props = {
  steps: readonly CourseStep[];
  /** The course has stopped: the words say so on the step that is now. */
  held?: ReactNode;
  label?: string;
};

/** Where a thing is on its course. Inside a TitleBlock it becomes the block's last row. */
export function CourseStrip({ steps, held, label = "Course" }: Props) {
  return (
    <ol
      aria-label={label}
      className="grid grid-cols-1 border-t border-hair-2 tablet:auto-cols-fr tablet:grid-flow-col tablet:grid-cols-none"
    >
      {steps.map((step, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: steps have a fixed order and no identity
        <Step key={index} {...step} held={step.state === "now" ? held : undefined} />
      ))}
    </ol>
  );
}

const words = { done: "done", now: "now", next: "to come" };

function Step({ label, state, note, held }: CourseStep & { held?: ReactNode }) {
  return (
    <li
      aria-current={state === "now" ? "step" : undefined}
      className={classNames(
        "relative border-hair-2 px-3.5 pt-[7px] pb-2 text-small not-first:border-t tablet:not-first:border-t-0 tablet:not-first:border-l",
        state === "next" && "text-ink-2",
        state === "now" && "font-semibold",
        state === "now" && (held ? "text-held" : "text-petrol"),
        "after:absolute after:inset-y-0 after:left-0 after:w-[3px] after:content-[''] tablet:after:inset-y-auto tablet:after:right-0 tablet:after:bottom-0 tablet:after:h-[3px] tablet:after:w-auto",
        state === "done" && "after:bg-ink tablet:after:h-[2px]",
        state === "now" && (held ? "after:bg-held" : "after:bg-petrol"),
      )}
    >
      <span className="flex items-center gap-1.5">
        {state === "done" ? <Check aria-hidden="true" size={13} strokeWidth={2.4} /> : null}
        {held ? <Pause aria-hidden="true" size={13} strokeWidth={2.6} /> : null}
        {label}
        <span className="sr-only">, {words[state]}</span>
      </span>
      {held ? <span className="block font-medium">{held}</span> : null}
      {note ? <span className="block text-key font-normal text-ink-2">{note}</span> : null}
    </li>
  );
}
