import type { RevisionAddress } from '../queries/use-revision';
import { usePresence } from '../queries/use-presence';

interface Properties {
  address: RevisionAddress;
  editing: boolean;
}

/** Who else has the revision open, before two write at once. */
export function PresenceNotice({ address, editing }: Properties) {
  const others = usePresence(address, editing);
  if (others.length === 0) return null;
  const writes = others.some((one) => one.editing);
  return (
    <div className="notice" role="status">
      <span>
        {others.map(({ name, editing: isEditing }, index) => (
          <span key={name}>
            {index > 0 && ', '}
            <b>{name}</b>
            {isEditing && ' (editing)'}
          </span>
        ))}{' '}
        {others.length === 1 ? 'has' : 'have'} this draft open
        {writes ? ': who saves second is shown both versions, field by field.' : '.'}
      </span>
    </div>
  );
}
