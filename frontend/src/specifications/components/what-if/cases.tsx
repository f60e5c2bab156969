import { Button, Form, Input } from 'antd';
import { useMemo, useState } from 'react';
import { failureText } from '../../../api/api-error';
import { maySeeDrafts, usePerson } from '../../../api/session';
import { ChoiceField } from '../../../ui/fields';
import type { Answer } from '../../hooks/use-live-evaluation';
import { changedFigures, type CaseFigures, type WhatIfCase } from '../../model/what-if';
import { unitWords } from '../../model/words';
import { useCatalogue } from '../../queries/use-catalogue';
import type { RevisionAddress } from '../../queries/use-revision';
import { useNoteActs, useWhatIf } from '../../queries/use-what-if';

interface Properties {
  address: RevisionAddress;
  answer: Answer;
}

export function CasesPart({ address, answer }: Properties) {
  const [otherCode, setOtherCode] = useState<string | null>(null);
  const { data, error } = useWhatIf(answer, otherCode);
  const mayKeep = maySeeDrafts(usePerson());
  return (
    <section aria-labelledby="what-if-cases">
      <h3 id="what-if-cases">Other cases</h3>
      {error && <p className="bg-field-error">{failureText(error)}</p>}
      {!data && !error && <p className="zone-note">Working it out…</p>}
      {data && (
        <ul className="what-if-cases">
          {data.cases.map((one) => (
            <li key={one.id}>
              <CaseHead one={one as WhatIfCase} />
              {one.id === 'other-unit' && (
                <OtherUnit own={answer.input.string?.insulatorCode ?? null} code={otherCode} onCode={setOtherCode} />
              )}
              {one.after && (
                <>
                  <CaseFiguresList before={one.before as CaseFigures} after={one.after as CaseFigures} />
                  {mayKeep && <KeepCase key={answer.key + otherCode} address={address} one={one as WhatIfCase} />}
                </>
              )}
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function CaseHead({ one: { title, changed, available, why } }: { one: WhatIfCase }) {
  return (
    <div className="what-if-head">
      <h4>{title}</h4>
      {available ? <span>{changed}</span> : <span>{why}</span>}
    </div>
  );
}

function OtherUnit({
  own,
  code,
  onCode,
}: {
  own: string | null;
  code: string | null;
  onCode: (code: string | null) => void;
}) {
  const { data: units, isPending } = useCatalogue();
  const choices = useMemo(
    () =>
      (units ?? [])
        .filter((one) => !one.withdrawn && one.code !== own)
        .map((one) => ({ value: one.code, label: one.code, detail: unitWords(one) })),
    [units, own],
  );
  return (
    <Form component={false}>
      <ChoiceField
        id="what-if-other-unit"
        path="otherCode"
        label="Compare with"
        value={code}
        choices={choices}
        onChange={(_, next) => onCode(next)}
        searchable
        loading={isPending}
        listWidth={380}
      />
    </Form>
  );
}

/** What changes, before and after; what does not is said in one line. */
export function CaseFiguresList({ before, after }: { before: CaseFigures; after: CaseFigures }) {
  const rows = changedFigures(before, after);
  const shown = rows.filter(({ name, changed }) => changed || name === 'units');
  const same = rows.filter((one) => !shown.includes(one));
  return (
    <>
      <dl className="what-if-figures">
        {shown.map(({ name, label, before: was, after: is, changed }) => (
          <div key={name} className={changed ? 'is-changed' : undefined}>
            <dt>{label}</dt>
            <dd>
              <span className="bg-num">{was}</span>
              {changed ? (
                <>
                  <span aria-hidden="true"> → </span>
                  <span className="bg-hidden"> to </span>
                  <b className="bg-num">{is}</b>
                </>
              ) : (
                <small> as it is</small>
              )}
            </dd>
          </div>
        ))}
      </dl>
      {same.length > 0 && (
        <p className="zone-note">The same: {same.map(({ label }) => label.toLowerCase()).join(', ')}.</p>
      )}
    </>
  );
}

function KeepCase({ address, one }: { address: RevisionAddress; one: WhatIfCase }) {
  const { write } = useNoteActs(address);
  const [isOpen, setOpen] = useState(false);
  const [text, setText] = useState('');
  const { title, changed, before, after, id } = one;
  if (write.isSuccess && !isOpen) {
    return (
      <p className="zone-note" role="status">
        ✓ kept as a note, below
      </p>
    );
  }
  if (!isOpen) {
    return (
      <Button size="small" onClick={() => setOpen(true)} aria-label={`Keep as note: ${title}`}>
        Keep as note
      </Button>
    );
  }
  const keep = () =>
    write.mutate(
      {
        title: [title, changed].filter(Boolean).join(': ').slice(0, 160).trim(),
        text: text.trim(),
        figures: { before, after: after! },
      },
      { onSuccess: () => setOpen(false) },
    );
  return (
    <div className="what-if-keep">
      <label htmlFor={`keep-${id}`}>Why it is kept, if you like</label>
      <Input.TextArea
        id={`keep-${id}`}
        autoFocus
        rows={3}
        maxLength={2000}
        value={text}
        onChange={({ target }) => setText(target.value)}
      />
      <div className="what-if-acts">
        <Button size="small" type="primary" loading={write.isPending} onClick={keep}>
          Keep
        </Button>
        <Button size="small" onClick={() => setOpen(false)}>
          Leave it
        </Button>
      </div>
      {write.error && (
        <p className="bg-field-error" role="alert">
          {failureText(write.error)}
        </p>
      )}
    </div>
  );
}
