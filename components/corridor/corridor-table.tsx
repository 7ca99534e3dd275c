import type { CorridorRow } from './types';
import { rowName, signedPercent } from './words';

/** The corridor's data as a table, for screen readers. */
export function CorridorTable({
  rows,
  caption,
}: {
  rows: readonly CorridorRow[];
  caption: string;
}) {
  return (
    <div className="sr-only">
      <table>
        <caption>{caption}</caption>
        <thead>
          <tr>
            <th scope="col">Set point</th>
            <th scope="col">Limits</th>
            <th scope="col">Readings</th>
            <th scope="col">Mean</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowName(row)}>
              <th scope="row">
                {rowName(row)}
                {row.excluded ? ', not counted' : ''}
                {row.current ? ', being pulled now' : ''}
              </th>
              <td>
                {row.lower === null || row.upper === null
                  ? 'no tolerance here'
                  : `${signedPercent(row.lower)} to ${signedPercent(row.upper)}`}
              </td>
              <td>
                {row.readings.length === 0
                  ? 'none yet'
                  : row.readings
                      .map(({ deviation, beyond }) =>
                        [signedPercent(deviation, 2), beyond ? '(beyond)' : ''].join(' ').trim(),
                      )
                      .join(', ')}
              </td>
              <td>
                {row.mean === null
                  ? 'none yet'
                  : [
                      signedPercent(row.mean, 2),
                      row.meanExpanded === null ? '' : `± ${row.meanExpanded.toFixed(2)} %`,
                      row.words ?? '',
                    ]
                      .filter(Boolean)
                      .join(' ')}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
