import type { ReactNode } from "react";
import { Mark } from "./mark";

type Props = {
  title: ReactNode;
  /** What will stand here, and what brings it here. */
  children?: ReactNode;
  /** The next step, as a link or button. */
  action?: ReactNode;
};

export function EmptyState({ title, children, action }: Props) {
  return (
    <div className="flex flex-col items-center gap-1.5 px-6 py-10 text-center">
      <span className="mb-1 opacity-50 grayscale">
        <Mark size={32} />
      </span>
      <p className="text-large font-medium">{title}</p>
      {children ? <div className="max-w-prose text-ink-2">{children}</div> : null}
      {action ? <div className="mt-3 flex flex-wrap justify-center gap-2">{action}</div> : null}
    </div>
  );
}
