import { trailFieldLabel, type TrailChange } from '@bellgap/common/api';
import './changes.css';
import { trailValueWords, wholeValue } from './value-words';

const SHOWN_AT_ONCE = 5;

function Change({ change: { path, from, to, hidden } }: { change: TrailChange }) {
  return (
    <li>
      <span className="soft" title={path}>
        {trailFieldLabel(path)}
      </span>{' '}
      {hidden ? (
        <span>not shown to you yet</span>
      ) : (
        <>
          {from === null ? (
            <span className="soft">nothing</span>
          ) : (
            <del title={wholeValue(from)}>{trailValueWords(path, from)}</del>
          )}
          <span aria-hidden="true"> → </span>
          <ins title={wholeValue(to)}>{trailValueWords(path, to)}</ins>
        </>
      )}
    </li>
  );
}

/** Old and new value of each field; many open on request. */
export function ChangeList({ changes }: { changes: readonly TrailChange[] }) {
  if (changes.length === 0) return <span className="soft">—</span>;
  const rest = changes.slice(SHOWN_AT_ONCE);
  return (
    <>
      <ul className="changes">
        {changes.slice(0, SHOWN_AT_ONCE).map((change) => (
          <Change key={change.path} change={change} />
        ))}
      </ul>
      {rest.length > 0 && (
        <details>
          <summary>{rest.length} more</summary>
          <ul className="changes">
            {rest.map((change) => (
              <Change key={change.path} change={change} />
            ))}
          </ul>
        </details>
      )}
    </>
  );
}
