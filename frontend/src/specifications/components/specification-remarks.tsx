import type { Revision, TraceLine } from '@bellgap/common/api';
import { RemarksPanel } from '../../ui/remarks';
import type { RevisionAddress } from '../queries/use-revision';
import { idOf } from './fields-at';

interface Properties {
  revision: Revision;
  address: RevisionAddress;
  lines: readonly TraceLine[];
}

/** Remarks below the sheet, from the first submission on. */
export function SpecificationRemarks({ revision, address, lines }: Properties) {
  if (revision.state === 'draft' && revision.returned === null && revision.labels.length <= 1) return null;
  return (
    <div className="specification-remarks">
      <RemarksPanel
        address={address}
        input={revision.input}
        lines={lines}
        hrefOf={(path) => (path.startsWith('trace:') ? null : `#${idOf(path)}`)}
      />
    </div>
  );
}
