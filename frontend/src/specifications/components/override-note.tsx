import type { InheritedPath } from '@bellgap/common/schemas';
import { Input } from 'antd';
import { fieldOf } from '@bellgap/common/schemas';
import { useForm } from '../hooks/form-context';

interface Properties {
  path: InheritedPath;
  /** What the basis says, in words; null where it is a group of figures. */
  was: string | null;
}

/** Says that a figure differs from the design basis, why, and leads back. */
export function OverrideNote({ path, was }: Properties) {
  const { values, readOnly, setReason, backToBasis, leave } = useForm();
  const reason = values.reasons[path] ?? '';
  const label = fieldOf(path)?.label ?? path;
  return (
    <div className="override">
      <span>differs from the basis{was !== null && <> ({was})</>}: </span>
      {readOnly ? (
        <span>{reason === '' ? 'no reason given' : `“${reason}”`}</span>
      ) : (
        <>
          <Input
            size="small"
            aria-label={`Reason why it differs from the basis: ${label}`}
            placeholder="reason, needed for the check"
            value={reason}
            maxLength={500}
            status={reason.trim() === '' ? 'warning' : ''}
            onChange={({ target }) => setReason(path, target.value)}
            onBlur={leave}
          />
          <button type="button" className="bg-link" onClick={() => backToBasis(path)}>
            back to basis
          </button>
        </>
      )}
    </div>
  );
}
