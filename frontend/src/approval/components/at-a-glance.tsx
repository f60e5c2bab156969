import type { Approval } from '@bellgap/common/api';
import { glancesOf } from '../model/glance';

/** How much there is of each thing to look at; what is there leads to its part of the page. */
export function AtAGlance({ approval }: { approval: Approval }) {
  return (
    <nav aria-label="What to look at">
      <ul className="glances">
        {glancesOf(approval).map(({ anchor, label, count, asks }) => {
          const words = (
            <>
              {label} <b className="num">{count}</b>
            </>
          );
          return (
            <li key={anchor} className={count > 0 && asks ? 'is-asking' : undefined}>
              {count > 0 ? <a href={`#${anchor}`}>{words}</a> : <span className="soft">{words}</span>}
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
