import { CHECK_CATEGORY_LABELS, type Check, type CheckRecord } from '@bellgap/common/api';
import { CHECKLIST, CHECKLIST_ANSWERS, CHECK_VERDICTS } from '@bellgap/common/schemas';
import { dayText } from '../../ui/days';
import { Ledger } from '../../ui/ledger';
import { Moment } from '../../ui/moment';
import { Sheet } from '../../ui/page/sheet';
import { fieldWords } from '../../ui/remarks';
import { Differences } from './differences';

/** A check that is decided, as it stays in the record. */
export function DecidedCheck({ record, cards }: { record: CheckRecord; cards: Check['cards'] }) {
  const { checker, label, verdict, verdictNote, decidedAt, decidedOn, ticks, checklist, ownFigures } = record;
  return (
    <Sheet
      title={`Check of revision ${label} by ${checker}`}
      note={verdict && `${CHECK_VERDICTS[verdict]}${decidedOn ? `, signed ${dayText(decidedOn)}` : ''}`}
    >
      {verdictNote && <p className="check-note">{verdictNote}</p>}
      <Differences differences={record.differences} rules={cards} who={checker} />
      {record.differenceReason && <p className="check-note">Reason for the difference: {record.differenceReason}</p>}
      {ownFigures.note && <p className="check-note">How the figures came about: {ownFigures.note}</p>}
      <Ledger
        rows={[
          ['Category', CHECK_CATEGORY_LABELS[record.checkCategory] ?? String(record.checkCategory)],
          ['Own figures entered', <Moment key="own" at={record.ownFiguresAt} />],
          ['Signed', decidedAt ? <Moment key="decided" at={decidedAt} /> : null],
          ['Independence', record.independent ? 'declared' : 'not declared'],
          ['Content code', record.contentCode],
          ['Method', record.methodEdition],
        ]}
      />
      <details className="check-details">
        <summary>{ticks.length === 1 ? '1 input' : `${ticks.length} inputs`} looked at</summary>
        <ul>
          {ticks.map(({ path, seenIn, agreed }) => (
            <li key={path}>
              {agreed ? '✓' : '✕ not agreed:'} {fieldWords(path)}
              {seenIn && <span className="soft">, seen in {seenIn}</span>}
            </li>
          ))}
        </ul>
      </details>
      <details className="check-details">
        <summary>{checklist.length} points of the checklist</summary>
        <ul>
          {checklist.map(({ item, answer, note }) => (
            <li key={item}>
              {CHECKLIST[item]}: <b>{CHECKLIST_ANSWERS[answer]}</b>
              {note && <span className="soft">, {note}</span>}
            </li>
          ))}
        </ul>
      </details>
    </Sheet>
  );
}
