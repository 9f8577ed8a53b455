type Props = {
  caption: string;
  rowHead: string;
  columns: readonly string[];
  rows: readonly { key: string; head: string; cells: readonly string[] }[];
};

/** The figures behind a chart, for those who do not see it. */
export function SeriesTable({ caption, rowHead, columns, rows }: Props) {
  return (
    // A table takes the width it needs whatever it is told, so what is hidden is a box around it.
    <div className="sr-only">
      <table>
        <caption>{caption}</caption>
        <thead>
          <tr>
            <th scope="col">{rowHead}</th>
            {columns.map((column) => (
              <th key={column} scope="col">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, head, cells }) => (
            <tr key={key}>
              <th scope="row">{head}</th>
              {cells.map((cell, index) => (
                <td key={columns[index]}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
