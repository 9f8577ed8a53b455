import { classNames } from "../class-names";

/** The outline of what is being loaded. Name it once for the whole area with `label`. */
export function Skeleton({
  lines = 3,
  label = "Loading",
  className,
}: {
  lines?: number;
  label?: string;
  className?: string;
}) {
  return (
    <div role="status" className={classNames("flex flex-col gap-2.5", className)}>
      <span className="sr-only">{label}</span>
      {Array.from({ length: lines }, (_, line) => (
        <div
          // biome-ignore lint/suspicious/noArrayIndexKey: all lines are alike
          key={line}
          style={{ width: `${92 - ((line * 17) % 40)}%` }}
          className="h-3.5 animate-pulse rounded-mark bg-hair-2 motion-reduce:animate-none"
        />
      ))}
    </div>
  );
}
