/** The mark: a rail with evenly hanging bars. Decorative; the name stands beside it. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg aria-hidden="true" focusable="false" width={size} height={(size * 20) / 26} viewBox="0 0 26 20">
      <rect x="0" y="1" width="26" height="3.4" rx="1.7" className="fill-ink" />
      {[1.9, 7.9, 13.9, 19.9].map((x) => (
        <rect key={x} x={x} y="6.4" width="4" height="11" rx="1" className="fill-petrol" />
      ))}
    </svg>
  );
}

/** The mark with the name. */
export function Wordmark() {
  return (
    <span className="inline-flex items-center gap-[9px] text-large font-semibold tracking-tight">
      <Mark />
      Evenrail
    </span>
  );
}
