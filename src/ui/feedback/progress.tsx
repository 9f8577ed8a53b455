type Props = {
  label: string;
  /** 0 to 1; left out when nobody knows how far it is. */
  value?: number;
  labelHidden?: boolean;
};

export function Progress({ label, value, labelHidden = false }: Props) {
  const percent = value === undefined ? undefined : Math.round(Math.max(0, Math.min(1, value)) * 100);
  return (
    <div className="flex flex-col gap-1">
      {labelHidden ? null : (
        <div className="flex justify-between text-small text-ink-2">
          <span>{label}</span>
          {percent === undefined ? null : <span>{percent} %</span>}
        </div>
      )}
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        className="h-1.5 overflow-hidden rounded-mark bg-hair-2"
      >
        <div
          style={{ width: `${percent ?? 40}%` }}
          className={
            percent === undefined ? "h-full animate-pulse bg-petrol" : "h-full bg-petrol transition-[width]"
          }
        />
      </div>
    </div>
  );
}
