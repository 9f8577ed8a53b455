/** The format of a file of readings, where the file is chosen. */
export function FileFormatHelp({ tag }: { tag: string }) {
  return (
    <details className="mt-2 text-small">
      <summary className="font-medium">What the file looks like</summary>
      <p className="mt-1">
        A text in UTF-8 with one line of column names and one line per reading, at most 10 MB and 200 000
        lines. The columns, in any order: <code>tag</code>, <code>pulse_width_ms</code> and{" "}
        <code>pulse_count</code>, or <code>open_seconds</code> for a reading held open, <code>repeat</code> (1
        when left out), and <code>amount_ml</code> or <code>amount_g</code> as the bench collects.
      </p>
      <pre className="mt-1 overflow-x-auto bg-ground p-2 text-key">
        {`tag,pulse_width_ms,pulse_count,open_seconds,repeat,amount_ml
${tag},2,2000,,1,15.5
${tag},,,10,1,73.5`}
      </pre>
    </details>
  );
}
