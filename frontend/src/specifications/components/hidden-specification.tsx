import type { Revision } from '@bellgap/common/api';
import { Button } from 'antd';
import { useCallback, useMemo, useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import { FormContext } from '../hooks/form-context';
import { useFormContext } from '../hooks/use-form-context';
import { useSaving } from '../hooks/use-saving';
import { useSpecificationForm } from '../hooks/use-specification-form';
import { useUnit } from '../hooks/use-unit';
import { faultsOf, isReadable } from '../model/faults';
import { bodyOf } from '../model/form';
import type { RevisionAddress } from '../queries/use-revision';
import { InputsZone } from './inputs-zone';
import { SavingWords } from './saving-words';
import { SpecificationCrumbs } from './specification-crumbs';
import { TitleBlock } from './title-block';
import './specification.css';

const NO_MARKS: never[] = [];

interface Properties {
  revision: Revision;
  /** Begins the page anew once the figures are shown: whoever has edited cannot check any more. */
  onShown: (revision: Revision) => void;
}

/** What a checker sees before his own count: the inputs, and no figure that rests on them. */
export function HiddenSpecification({ revision, onShown }: Properties) {
  const { basis, context, projectCode: code, number, label } = revision;
  const address = useMemo<RevisionAddress>(() => ({ code, number, label }), [code, number, label]);
  const [isEditing, setEditing] = useState(false);
  const { values, replace: _replace, ...setters } = useSpecificationForm(revision, basis);
  const unit = useUnit(values, context.insulator);
  const body = useMemo(() => bodyOf(values, unit, basis), [values, unit, basis]);
  const key = useMemo(() => JSON.stringify(body), [body]);
  const ownFaults = useMemo(() => faultsOf(body), [body]);
  const readable = isReadable(values) && ownFaults.length === 0;
  const onSaved = useCallback(
    (saved: Revision) => {
      if (saved.evaluation !== null) onShown(saved);
    },
    [onShown],
  );
  const { saving, save } = useSaving({
    first: revision,
    address,
    draft: { values, body, key, readable },
    enabled: isEditing,
    onSaved,
  });
  const faults = useMemo(() => [...ownFaults, ...saving.faults], [ownFaults, saving.faults]);
  const leave = useCallback(() => void save(false), [save]);
  const form = useFormContext({
    values,
    basis,
    unit,
    readOnly: !isEditing,
    faults,
    marks: NO_MARKS,
    leave,
    ...setters,
  });
  const mayEdit = revision.mayEdit && revision.state === 'draft';
  return (
    <FormContext value={form}>
      <div className="specification is-hidden-figures">
        <div className="specification-head">
          <SpecificationCrumbs revision={revision} title={values.title}>
            <SavingWords saving={saving} readable={readable} readOnly={!isEditing} onRetry={leave} />
          </SpecificationCrumbs>
        </div>
        <div className="hidden-figures">
          <h2>The figures of the author are hidden from you</h2>
          <p>
            You may check this specification, so you count for yourself before you see what the author counted. The
            inputs stand below as they are.
          </p>
          {revision.state === 'in_check' ? (
            <Link className="hidden-figures-act" to={paths.check.to(code, number, label)}>
              Enter your own count on the check page
            </Link>
          ) : (
            <p>It is a draft: it can be checked once it is submitted.</p>
          )}
          {mayEdit && !isEditing && (
            <p>
              <b>If you edit this revision you can no longer check or approve it.</b>{' '}
              <Button size="small" onClick={() => setEditing(true)}>
                Edit it all the same
              </Button>
            </p>
          )}
          {isEditing && <p role="status">The figures are shown with your first change.</p>}
        </div>
        <div className="zones is-inputs-only">
          <InputsZone />
        </div>
        <TitleBlock revision={revision} />
      </div>
    </FormContext>
  );
}
