import type { FieldError } from '@bellgap/common/api';
import { fieldPath } from '../../model/faults';
import { idOf } from '../fields-at';

/** Fields that stand on the page under the id of another: a level is chosen whole. */
const STANDS_IN: [RegExp, string][] = [[/^system\.insulationLevel\..*/, 'system.insulationLevel']];

function controlOf(path: string): HTMLElement | null {
  const own = path.replace(/^(input|overrides)\./, '');
  const at = STANDS_IN.reduce((now, [inner, outer]) => now.replace(inner, outer), fieldPath(own));
  return document.getElementById(idOf(at));
}

function goTo(path: string): void {
  const control = controlOf(path);
  control?.scrollIntoView?.({ block: 'center' });
  control?.focus({ preventScroll: true });
}

/** What stands in the way of a submission, each leading to its field. */
export function SubmissionBars({ bars }: { bars: readonly FieldError[] }) {
  return (
    <div className="submission-bars" role="alert">
      <p>
        {bars.length === 1 ? 'One thing stands' : `${bars.length} things stand`} in the way; each leads to its field.
      </p>
      <ul>
        {bars.map(({ path, message }) => (
          <li key={path + message}>
            <button type="button" className="bg-link" onClick={() => goTo(path)}>
              {message}
            </button>
          </li>
        ))}
      </ul>
    </div>
  );
}
