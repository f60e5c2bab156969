import { CHECKLIST, CHECKLIST_ANSWERS, type ChecklistAnswer, type ChecklistItem } from '@bellgap/common/schemas';
import { Checkbox, Input, Radio } from 'antd';
import { memo } from 'react';
import { Sheet } from '../../ui/page/sheet';
import type { CheckDraft, Point } from '../model/draft';

const BLANK: Point = { answer: null, note: '' };
const ITEMS = Object.keys(CHECKLIST) as ChecklistItem[];
const ANSWERS = Object.entries(CHECKLIST_ANSWERS).map(([value, label]) => ({ value, label }));

type Change = (next: (before: CheckDraft) => CheckDraft) => void;

interface Properties {
  draft: CheckDraft;
  change: Change;
}

/** What a checker asks himself before he signs, and that he had no part in the work. */
export function Checklist({ draft, change }: Properties) {
  const answered = ITEMS.filter((item) => draft.points[item]?.answer).length;
  return (
    <Sheet
      title="4 Checklist"
      note={
        <span role="status">
          {answered} of {ITEMS.length} answered
        </span>
      }
    >
      <ul className="points">
        {ITEMS.map((item) => (
          <PointRow key={item} item={item} point={draft.points[item] ?? BLANK} change={change} />
        ))}
      </ul>
      <Checkbox
        className="independence"
        checked={draft.independent}
        onChange={({ target }) => change((before) => ({ ...before, independent: target.checked }))}
      >
        I had no part in this work: I neither wrote nor chose any of its inputs, and I judge it by my own knowledge.
      </Checkbox>
    </Sheet>
  );
}

interface PointProperties {
  item: ChecklistItem;
  point: Point;
  change: Change;
}

const PointRow = memo(function PointRow({ item, point, change }: PointProperties) {
  const set = (next: Partial<Point>) =>
    change((draft) => ({ ...draft, points: { ...draft.points, [item]: { ...point, ...next } } }));
  return (
    <li className="point">
      <span id={`point-${item}`}>{CHECKLIST[item]}</span>
      <Radio.Group
        aria-labelledby={`point-${item}`}
        optionType="button"
        size="small"
        options={ANSWERS}
        value={point.answer}
        onChange={({ target }) => set({ answer: target.value as ChecklistAnswer })}
      />
      {point.answer !== null && (
        <Input
          size="small"
          className="point-note"
          value={point.note}
          maxLength={500}
          aria-label={`Note: ${CHECKLIST[item]}`}
          placeholder={point.answer === 'no' ? 'note, needed' : 'note'}
          onChange={({ target }) => set({ note: target.value })}
        />
      )}
    </li>
  );
});
