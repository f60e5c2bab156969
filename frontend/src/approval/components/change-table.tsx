import '../../ui/data-table/data-table.css';
import { trailValueWords, wholeValue } from '../../ui/changes';

export interface ShownChange {
  path: string;
  label: string;
  from: unknown;
  to: unknown;
}

/** All changes at once: what is approved is read whole. */
export function ChangeTable({ changes, before }: { changes: readonly ShownChange[]; before: string }) {
  return (
    <div className="table-scroll" role="region" aria-label="What is new, table" tabIndex={0}>
      <table className="rows">
        <thead>
          <tr>
            <th scope="col">Field</th>
            <th scope="col">{before}</th>
            <th scope="col">Now</th>
          </tr>
        </thead>
        <tbody>
          {changes.map(({ path, label, from, to }) => (
            <tr key={path}>
              <td>{label}</td>
              <td className="is-wrapping soft" title={wholeValue(from)}>
                {trailValueWords(path, from)}
              </td>
              <td className="is-wrapping" title={wholeValue(to)}>
                {trailValueWords(path, to)}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
