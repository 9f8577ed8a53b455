import type { ReactNode } from "react";

type Props = {
  /** What was found, small above. */
  before: ReactNode;
  /** What was left, below. */
  after: ReactNode;
  small?: ReactNode;
};

/** Two states of one figure in one table cell: the earlier small above, the later below. */
export function BeforeAfter({ before, after, small }: Props) {
  return (
    <>
      <span className="block text-small leading-[14px] font-normal text-ink-2">{before}</span>
      <span className="font-medium">{after}</span>
      {small ? <span className="ml-1 text-key font-normal text-ink-2">{small}</span> : null}
    </>
  );
}
