import type { InsulatorUnit } from '@bellgap/common/api';
import { Button, Input } from 'antd';
import { memo, useMemo, useRef, type KeyboardEvent } from 'react';
import { Sheet } from '../../ui/page/sheet';
import { RemarkButton } from '../../ui/remarks';
import type { CheckDraft, Tick } from '../model/draft';
import { inputAnchor, type InputGroup, type InputRow } from '../model/inputs';

const BLANK: Tick = { seenIn: '', agreed: null };

type Change = (next: (before: CheckDraft) => CheckDraft) => void;

interface Properties {
  groups: InputGroup[];
  unit: InsulatorUnit | null;
  ticks: CheckDraft['ticks'];
  change: Change;
  readOnly: boolean;
}

const withTicks = (draft: CheckDraft, given: Record<string, Tick>): CheckDraft => ({
  ...draft,
  ticks: { ...draft.ticks, ...given },
});

/** Every input, looked at one by one: what it was seen in, and whether it is agreed. */
export function InputTicks({ groups, unit, ticks, change, readOnly }: Properties) {
  const list = useRef<HTMLDivElement>(null);
  const rows = useMemo(() => groups.flatMap((group) => group.rows), [groups]);
  const seen = rows.filter(({ path }) => (ticks[path]?.agreed ?? null) !== null).length;

  const goOn = (path: string) => {
    const next = rows[rows.findIndex((row) => row.path === path) + 1];
    const field = next && list.current?.querySelector<HTMLElement>(`#${inputAnchor(next.path)} input`);
    if (field) field.focus();
    else list.current?.closest('section')?.querySelector<HTMLElement>('.ticks-end')?.focus();
  };
  /** Enter agrees and goes on; a field left empty was seen in the same as the one before. */
  const tick = (path: string) => {
    change((draft) => {
      const before = rows[rows.findIndex((row) => row.path === path) - 1];
      const own = draft.ticks[path] ?? BLANK;
      const seenIn = own.seenIn || (before ? (draft.ticks[before.path]?.seenIn ?? '') : '');
      return withTicks(draft, { [path]: { seenIn, agreed: true } });
    });
    goOn(path);
  };
  return (
    <Sheet
      title="2 Inputs"
      note={
        <span role="status">
          {seen} of {rows.length} looked at
        </span>
      }
    >
      {!readOnly && (
        <p className="check-lead">
          Write what you saw a value in and press Enter: it is agreed and the next one waits. An empty line takes the
          words of the one before.
        </p>
      )}
      <div ref={list} className="ticks">
        {groups.map((group) => (
          <section key={group.name} aria-label={group.name}>
            <div className="ticks-group">
              <h3>{group.name}</h3>
              {!readOnly && <GroupTick group={group} change={change} />}
            </div>
            <ul>
              {group.rows.map((row) => (
                <TickRow
                  key={row.path}
                  row={row}
                  tick={ticks[row.path] ?? BLANK}
                  detail={row.path === 'string.insulatorCode' ? unit : null}
                  change={change}
                  onEnter={tick}
                  readOnly={readOnly}
                />
              ))}
            </ul>
          </section>
        ))}
      </div>
      <p className="ticks-end soft" tabIndex={-1}>
        {seen === rows.length ? 'Every input has been looked at.' : `${rows.length - seen} still to look at.`}
      </p>
    </Sheet>
  );
}

/** All of a group that is still open, with one text. */
function GroupTick({ group, change }: { group: InputGroup; change: Change }) {
  const field = useRef<HTMLInputElement>(null);
  const all = () => {
    const seenIn = field.current?.value.trim() ?? '';
    change((draft) =>
      withTicks(
        draft,
        Object.fromEntries(
          group.rows.flatMap(({ path }) => {
            const own = draft.ticks[path] ?? BLANK;
            return own.agreed === null ? [[path, { seenIn: own.seenIn || seenIn, agreed: true }]] : [];
          }),
        ),
      ),
    );
  };
  return (
    <form
      className="ticks-all"
      onSubmit={(event) => {
        event.preventDefault();
        all();
      }}
    >
      <input
        ref={field}
        className="ticks-all-text ant-input ant-input-sm"
        maxLength={200}
        aria-label={`All of ${group.name}, seen in`}
        placeholder="all seen in"
      />
      <Button size="small" htmlType="submit">
        Agree to all open
      </Button>
    </form>
  );
}

interface RowProperties {
  row: InputRow;
  tick: Tick;
  detail: InsulatorUnit | null;
  change: Change;
  onEnter: (path: string) => void;
  readOnly: boolean;
}

const STATE_WORDS = (agreed: boolean | null): string =>
  agreed === null ? 'not looked at' : agreed ? 'agreed' : 'not agreed';

const TickRow = memo(function TickRow({ row, tick, detail, change, onEnter, readOnly }: RowProperties) {
  const { path, label, value } = row;
  const { seenIn, agreed } = tick;
  const set = (next: Partial<Tick>) => change((draft) => withTicks(draft, { [path]: { ...tick, ...next } }));
  const state = agreed === null ? 'open' : agreed ? 'agreed' : 'refused';
  return (
    <li id={inputAnchor(path)} className={`tick is-${state}`}>
      <div className="tick-what">
        <span>{label}</span> <b className={/^[-−\d]/.test(value) ? 'num' : undefined}>{value}</b>
        {detail && (
          <small>
            {detail.failingLoadKn} kN, {detail.creepageMm} mm creepage, spacing {detail.spacingMm} mm
          </small>
        )}
      </div>
      {readOnly ? (
        <span className="tick-seen">{seenIn && `seen in ${seenIn}`}</span>
      ) : (
        <Input
          size="small"
          className="tick-seen"
          value={seenIn}
          maxLength={200}
          aria-label={`${label}, seen in`}
          placeholder="seen in"
          onChange={({ target }) => set({ seenIn: target.value })}
          onKeyDown={(event: KeyboardEvent) => {
            if (event.key !== 'Enter' || event.nativeEvent.isComposing) return;
            event.preventDefault();
            onEnter(path);
          }}
        />
      )}
      {readOnly ? (
        <span className="tick-state">{STATE_WORDS(agreed)}</span>
      ) : (
        <span className="tick-acts" role="group" aria-label={`${label}: ${STATE_WORDS(agreed)}`}>
          <Button
            size="small"
            aria-pressed={agreed === true}
            onClick={() => set({ agreed: agreed === true ? null : true })}
          >
            {agreed === true ? '✓ agreed' : 'agree'}
          </Button>
          <Button
            size="small"
            aria-pressed={agreed === false}
            onClick={() => set({ agreed: agreed === false ? null : false })}
          >
            {agreed === false ? '✕ not agreed' : 'not'}
          </Button>
          <RemarkButton path={path} about={label} />
        </span>
      )}
    </li>
  );
});
