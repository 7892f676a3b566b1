// A plain table of figures; on a narrow screen it scrolls inside its own frame, by touch or by keyboard.
export interface Column {
  head: string
  isFigure?: boolean
}

export function DataTable({
  caption,
  columns,
  rows,
}: {
  caption: string
  columns: Column[]
  rows: { key: string; cells: string[] }[]
}) {
  return (
    <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto pb-3">
      <table className="w-full border-collapse text-small text-ink">
        <caption className="pb-1 text-left text-graphite">{caption}</caption>
        <thead>
          <tr>
            {columns.map(({ head, isFigure }) => (
              <th
                key={head}
                scope="col"
                className={`border-b border-rule py-1.5 pr-2.5 align-bottom font-medium last:pr-0 ${isFigure ? 'text-right' : 'text-left'}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ key, cells }) => (
            <tr key={key}>
              {cells.map((cell, index) => {
                const look = `border-b border-rule py-1.5 pr-2.5 whitespace-nowrap last:pr-0 ${columns[index]?.isFigure ? 'text-right' : 'text-left'}`
                return index === 0 ? (
                  <th key={columns[index]?.head} scope="row" className={`${look} font-medium`}>
                    {cell}
                  </th>
                ) : (
                  <td key={columns[index]?.head} className={look}>
                    {cell}
                  </td>
                )
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
