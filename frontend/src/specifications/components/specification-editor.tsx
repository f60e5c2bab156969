import { contract, type Revision, type SpecificationInput } from '@bellgap/common/api';
import { useMutation } from '@tanstack/react-query';
import { useCallback, useMemo, useState } from 'react';
import { ApiError, failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { TraceSourceContext } from '../../ui/trace';
import { FormContext } from '../hooks/form-context';
import { HighlightProvider } from '../hooks/highlight';
import { useFormContext } from '../hooks/use-form-context';
import { useLiveEvaluation, type Answer } from '../hooks/use-live-evaluation';
import { useSaving } from '../hooks/use-saving';
import { useSpecificationForm } from '../hooks/use-specification-form';
import { useTraceSource } from '../hooks/use-trace-source';
import { asStored, bodyOf, formOf, type FormValues } from '../model/form';
import { faultsOf, isReadable } from '../model/faults';
import { setOffers, takeOffers } from '../model/kept-draft';
import type { ShownRevision } from '../model/shown-revision';
import { useUnit } from '../hooks/use-unit';
import { paramsOf } from '../queries/use-revision';
import { AnswerBar } from './answer-bar';
import { ConflictDialog } from './conflict-dialog';
import { DrawingZone } from './drawing-zone';
import { EditQuestion } from './edit-question';
import { InputsZone } from './inputs-zone';
import { LedgerZone } from './ledger-zone';
import { MovesBar } from './moves';
import { KeptNotice, NewerBasis } from './notices';
import { PresenceNotice } from './presence-notice';
import { SavingWords } from './saving-words';
import { SheetActions } from './sheet-actions';
import { SpecificationCrumbs } from './specification-crumbs';
import { SpecificationRemarks } from './specification-remarks';
import { TitleBlock } from './title-block';
import { WhatIfAction } from './what-if';
import './specification.css';

const NOT_SAVED = 'The draft has to be saved before it can rest on the newer basis; see what is marked.';

interface Properties {
  /** The revision as it was fetched; the form begins from it. */
  first: ShownRevision;
  /** Begins the page anew from a revision that has moved on. */
  onMoved: (revision: Revision) => void;
}

/** Input of earlier visits that the server does not have. */
function offersOf(first: Revision, key: string) {
  const { context, basis } = first;
  return takeOffers(
    first.id,
    ({ values }) => isReadable(values) && JSON.stringify(bodyOf(values, context.insulator, basis)) === key,
  );
}

export function SpecificationEditor({ first, onMoved }: Properties) {
  const [revision, setRevision] = useState<Revision>(first);
  const address = useMemo(
    () => ({ code: first.projectCode, number: first.number, label: first.label }),
    [first.projectCode, first.number, first.label],
  );
  const readOnly = !first.mayEdit || first.state !== 'draft';
  const { basis } = revision;
  const { values, replace, ...setters } = useSpecificationForm(first, basis);
  const unit = useUnit(values, revision.context.insulator);
  const body = useMemo(() => bodyOf(values, unit, basis), [values, unit, basis]);
  const key = useMemo(() => JSON.stringify(body), [body]);
  const input = body.input as SpecificationInput;
  const inputKey = useMemo(() => JSON.stringify(input), [input]);
  const ownFaults = useMemo(() => faultsOf(body), [body]);
  const readable = isReadable(values);
  const inputFaulty = ownFaults.some(({ path }) => path.startsWith('input'));

  const [begun] = useState<Answer>(() => ({ input, key: inputKey, evaluation: first.evaluation }));
  const [firstKey] = useState(key);
  const live = useLiveEvaluation({ input, key: inputKey, readable: readable && !inputFaulty }, begun);
  // What a save gives back is taken over where it says something new; fields stay as they are drawn.
  const onSaved = useCallback(
    (saved: Revision) =>
      setRevision((now) => (now.basis?.id === saved.basis?.id ? { ...saved, basis: now.basis } : saved)),
    [],
  );
  const [isAgreed, agree] = useState(!first.editBarsSigning);
  const [wantsBasis, wantBasis] = useState(false);
  const draft = { values, body, key, readable: readable && ownFaults.length === 0 };
  const { saving, save, rebase, compareWith, versionNow } = useSaving({
    first,
    address,
    draft,
    enabled: !readOnly && isAgreed,
    onSaved,
  });
  const [offers, setOffersShown] = useState(() => (readOnly ? [] : offersOf(first, key)));
  const traceSource = useTraceSource(live.answer);

  const faults = useMemo(
    () => [...ownFaults, ...live.faults, ...saving.faults],
    [ownFaults, live.faults, saving.faults],
  );
  const { evaluation } = live.answer;
  const marks = useMemo(
    () => evaluation.cautions.filter(({ severity }) => severity === 'stop' || severity === 'fail'),
    [evaluation],
  );
  const leave = useCallback(() => void save(false), [save]);
  const context = useFormContext({ values, basis, unit, readOnly, faults, marks, leave, ...setters });

  /** Begins anew from a version of the server, with the form holding `next`. */
  const beginFrom = (current: Revision, next: FormValues) => {
    setRevision(current);
    rebase(current, JSON.stringify(bodyOf(formOf(current), current.context.insulator, current.basis)));
    replace(next);
  };

  const takeBasis = useMutation({
    mutationFn: async () => {
      if (!(await save(false))) throw new ApiError({ code: 'validation', status: 0, message: NOT_SAVED });
      const answer = await call(contract.takeBasis, { params: paramsOf(address), ifMatch: versionNow() });
      return answer as Revision;
    },
    onSuccess: (current) => beginFrom(current, formOf(current)),
  });

  const [offered] = offers;
  const settleOffer = () => {
    const left = offers.slice(1);
    setOffers(first.id, left);
    setOffersShown(left);
  };
  const takeBack = () => {
    if (!offered) return;
    settleOffer();
    replace(offered.values);
    if (offered.lockVersion !== versionNow()) compareWith(offered, revision);
  };

  const isTouched = !readOnly && (key !== firstKey || revision.lockVersion !== first.lockVersion || !readable);
  const isAsking = !readOnly && !isAgreed && (isTouched || wantsBasis);
  const { conflict } = saving;
  return (
    <FormContext value={context}>
      <TraceSourceContext value={traceSource}>
        <HighlightProvider>
          <div className="specification">
            <div className="specification-head">
              <SpecificationCrumbs revision={revision} title={values.title}>
                {isAsking ? (
                  <span className="saving is-open">not saved: waits for your answer</span>
                ) : (
                  <SavingWords saving={saving} readable={draft.readable} readOnly={readOnly} onRetry={leave} />
                )}
              </SpecificationCrumbs>
              <SheetActions
                address={address}
                lastSheet={first.lastSheet}
                beforeDrawing={() => (readOnly ? Promise.resolve(true) : save(false))}
                contentKey={key}
              >
                {input.kind !== 'bay' && <WhatIfAction address={address} answer={live.answer} unit={unit} />}
              </SheetActions>
            </div>
            <MovesBar
              revision={revision}
              address={address}
              save={() => save(false)}
              versionNow={versionNow}
              onMoved={onMoved}
            />
            {first.state === 'draft' && <PresenceNotice address={address} editing={isTouched} />}
            {isAsking && (
              <EditQuestion
                onEdit={() => {
                  agree(true);
                  if (wantsBasis) takeBasis.mutate();
                }}
                onLeave={() => {
                  wantBasis(false);
                  replace(formOf(first));
                }}
              />
            )}
            {offered && (
              <KeptNotice
                kept={offered}
                isOlder={offered.lockVersion !== revision.lockVersion}
                onTake={takeBack}
                onDiscard={settleOffer}
              />
            )}
            <NewerBasis
              revision={revision}
              readOnly={readOnly}
              isTaking={takeBasis.isPending}
              failure={takeBasis.error ? failureText(takeBasis.error) : null}
              onTakeOver={() => (isAgreed ? takeBasis.mutate() : wantBasis(true))}
            />
            <AnswerBar answer={live.answer} state={live.state} message={live.message} unit={unit} />
            <div className="zones">
              <InputsZone />
              <DrawingZone answer={live.answer} unit={unit} />
              <LedgerZone answer={live.answer} unit={unit} />
            </div>
            <TitleBlock revision={revision} />
          </div>
          <SpecificationRemarks revision={revision} address={address} lines={first.evaluation.trace} />
          {conflict && (
            <ConflictDialog
              mine={asStored(values, unit)}
              theirs={asStored(formOf(conflict.current), conflict.current.context.insulator)}
              origin={asStored(saving.origin, revision.context.insulator)}
              changedBy={conflict.changedBy}
              changedAt={conflict.changedAt}
              onResolve={(resolved) => beginFrom(conflict.current, resolved)}
            />
          )}
        </HighlightProvider>
      </TraceSourceContext>
    </FormContext>
  );
}
