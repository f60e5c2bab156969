import type { Revision } from '@bellgap/common/api';
import { Button } from 'antd';
import type { KeptDraft } from '../model/kept-draft';
import { momentText } from '../../ui/moment';

interface BasisProperties {
  revision: Revision;
  readOnly: boolean;
  isTaking: boolean;
  failure: string | null;
  onTakeOver: () => void;
}

export function NewerBasis({ revision, readOnly, isTaking, failure, onTakeOver }: BasisProperties) {
  const { newerBasisRevision, basis } = revision;
  if (newerBasisRevision === null) return null;
  return (
    <div className="notice" role="status">
      <span>
        The basis has revision {newerBasisRevision}; this draft rests on {basis?.revision ?? 'none'}. Figures that
        differ from the basis with a reason stay as they are.
      </span>
      {!readOnly && (
        <Button size="small" loading={isTaking} onClick={onTakeOver}>
          Take over
        </Button>
      )}
      {failure && <span className="bg-field-error">{failure}</span>}
    </div>
  );
}

interface KeptProperties {
  kept: KeptDraft;
  isOlder: boolean;
  onTake: () => void;
  onDiscard: () => void;
}

export function KeptNotice({ kept, isOlder, onTake, onDiscard }: KeptProperties) {
  return (
    <div className="notice" role="status">
      <span>
        Input of {momentText(kept.keptAt)} was not saved and is kept in this browser.
        {isOlder && ' The draft has been saved since; both will be shown field by field.'}
      </span>
      <Button size="small" type="primary" onClick={onTake}>
        Take it back
      </Button>
      <Button size="small" onClick={onDiscard}>
        Discard it
      </Button>
    </div>
  );
}
