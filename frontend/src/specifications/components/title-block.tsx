import type { Revision } from '@bellgap/common/api';
import { Input } from 'antd';
import { memo } from 'react';
import { RevisionStateMark } from '../../ui/revision-state';
import { useForm } from '../hooks/form-context';
import { faultAt } from '../model/faults';

interface Signed {
  name: string;
  on: string;
}

function Signature({ label, by }: { label: string; by: Signed | null }) {
  return (
    <div>
      <dt>{label}</dt>
      <dd>
        {by ? (
          <>
            {by.name} <span className="bg-num">{by.on}</span>
          </>
        ) : (
          <span title="not signed">—</span>
        )}
      </dd>
    </div>
  );
}

/** The title block along the foot, as on an engineering drawing; the title is written in it. */
export const TitleBlock = memo(function TitleBlock({ revision }: { revision: Revision }) {
  return (
    <dl className="title-block" aria-label="Title block">
      <div>
        <dt>project</dt>
        <dd>{revision.projectTitle}</dd>
      </div>
      <TitleCell />
      <div>
        <dt>number</dt>
        <dd className="bg-num">{revision.number}</dd>
      </div>
      <div>
        <dt>revision</dt>
        <dd>
          <span className="bg-num">{revision.label}</span> <RevisionStateMark state={revision.state} />
        </dd>
      </div>
      <Signature label="drawn" by={revision.drafted} />
      <Signature label="checked" by={revision.checked} />
      <Signature label="approved" by={revision.approved} />
    </dl>
  );
});

function TitleCell() {
  const { values, readOnly, faults, setTitle, leave } = useForm();
  const fault = faultAt(faults, 'title');
  return (
    <div className="title-cell">
      <dt>
        <label htmlFor="field-title">title</label>
      </dt>
      <dd>
        {readOnly ? (
          values.title
        ) : (
          <Input
            id="field-title"
            variant="borderless"
            value={values.title}
            maxLength={160}
            aria-invalid={fault ? true : undefined}
            aria-describedby={fault ? 'field-title-note' : undefined}
            onChange={({ target }) => setTitle(target.value)}
            onBlur={leave}
          />
        )}
        {fault && (
          <div className="bg-field-error" id="field-title-note">
            {fault}
          </div>
        )}
      </dd>
    </div>
  );
}
