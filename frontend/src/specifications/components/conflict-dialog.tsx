import { Modal, Radio } from 'antd';
import { useState } from 'react';
import { momentText } from '../../ui/moment';
import { differences, merged, type Difference } from '../model/compare';
import type { FormValues } from '../model/form';
import { valueWords } from '../model/words';

interface Properties {
  mine: FormValues;
  theirs: FormValues;
  /** What both began from. */
  origin: FormValues;
  changedBy: string | null;
  changedAt: string;
  onResolve: (values: FormValues) => void;
}

type Side = 'mine' | 'theirs';

const CHANGED: Record<Difference['changedBy'], string> = {
  me: 'changed by you',
  them: 'changed by the other',
  both: 'changed by both',
};

function pathOf(key: string): string {
  return key.replace(/^input\./, '');
}

/** Both versions of a draft, field by field. Nothing of either is lost: what only one changed is taken, the rest is chosen. */
export function ConflictDialog({ mine, theirs, origin, changedBy, changedAt, onResolve }: Properties) {
  // The versions stay as they were when the dialog opened; the page below cannot be typed in meanwhile.
  const [differing] = useState(() => differences(mine, theirs, origin));
  const [chosen, setChosen] = useState<Record<string, Side>>({});
  const sideOf = ({ key, changedBy: by }: Difference): Side | undefined =>
    chosen[key] ?? (by === 'me' ? 'mine' : by === 'them' ? 'theirs' : undefined);
  const open = differing.filter((one) => sideOf(one) === undefined).length;
  const resolve = () =>
    onResolve(
      merged(theirs, differing, new Set(differing.filter((one) => sideOf(one) === 'mine').map(({ key }) => key))),
    );
  const all = (side: Side) => setChosen(Object.fromEntries(differing.map(({ key }) => [key, side])));
  return (
    <Modal
      open
      title="This draft was saved meanwhile"
      width={760}
      closable={false}
      keyboard={false}
      mask={{ closable: false }}
      okText="Go on with these"
      onOk={resolve}
      okButtonProps={{ disabled: open > 0 }}
      cancelText="Mine everywhere"
      onCancel={() => all('mine')}
      footer={(_, { OkBtn, CancelBtn }) => (
        <div className="conflict-foot">
          <span>
            {open === 0
              ? 'Every field is settled.'
              : `${open} ${open === 1 ? 'field was' : 'fields were'} changed by both: choose.`}
          </span>
          <CancelBtn />
          <OkBtn />
        </div>
      )}
    >
      <p>
        {changedBy ?? 'Somebody'} saved it on {momentText(changedAt)}, while you were typing. Choose field by field;
        what you typed stays here until then.
      </p>
      {differing.length === 0 ? (
        <p className="soft">Both versions hold the same figures.</p>
      ) : (
        <div className="conflict-list">
          {differing.map((one) => (
            <fieldset key={one.key} className={`conflict-row is-${one.changedBy}`}>
              <legend>
                {one.label}{' '}
                <small>
                  {CHANGED[one.changedBy]}, before: {valueWords(pathOf(one.key), one.before)}
                </small>
              </legend>
              <Radio.Group
                aria-label={one.label}
                value={sideOf(one)}
                onChange={({ target }) => setChosen((now) => ({ ...now, [one.key]: target.value as Side }))}
                options={[
                  {
                    value: 'mine',
                    label: (
                      <span>
                        mine: <b>{valueWords(pathOf(one.key), one.mine)}</b>
                      </span>
                    ),
                  },
                  {
                    value: 'theirs',
                    label: (
                      <span>
                        theirs: <b>{valueWords(pathOf(one.key), one.theirs)}</b>
                      </span>
                    ),
                  },
                ]}
              />
            </fieldset>
          ))}
        </div>
      )}
    </Modal>
  );
}
