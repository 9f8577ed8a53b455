export type ReadoutRow = { key: string; label: string; left?: string; found?: string };

type Props = { title: string; rows: readonly ReadoutRow[]; withFound: boolean };

/** What stands under the pointer. */
export function Readout({ title, rows, withFound }: Props) {
  return (
    <div className="rounded-control border border-hair bg-raised px-2.5 py-1.5 text-small shadow-float">
      <p className="mb-0.5 font-semibold">{title}</p>
      <table className="border-collapse">
        <thead className="text-key text-ink-2">
          <tr>
            <th />
            {withFound ? <th className="pl-3 text-right font-normal">found</th> : null}
            <th className="pl-3 text-right font-normal">left</th>
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, label, left, found }) => (
            <tr key={key} className="leading-4">
              <th className="text-left font-medium">{label}</th>
              {withFound ? <td className="pl-3 text-right text-ink-2">{found ?? "–"}</td> : null}
              <td className="pl-3 text-right font-medium">{left ?? "–"}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
