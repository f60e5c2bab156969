import type { Remark } from '@bellgap/common/api';
import { Button } from 'antd';
import { useEffect, useRef, useState, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { failureText } from '../../api/api-error';
import { Moment } from '../moment';
import { AnswerForm } from './remark-form';
import type { useRemarkActs } from './use-remarks';

interface Properties {
  remark: Remark;
  about: ReactNode;
  acts: ReturnType<typeof useRemarkActs>;
}

export const remarkAnchor = (id: string): string => `remark-${id}`;

/** Whether the address leads to this remark; then it is brought into view. */
function usePointedAt(id: string) {
  const { hash } = useLocation();
  const element = useRef<HTMLLIElement>(null);
  const isPointedAt = hash === `#${remarkAnchor(id)}`;
  useEffect(() => {
    if (!isPointedAt) return;
    element.current?.scrollIntoView?.({ block: 'center' });
    element.current?.focus({ preventScroll: true });
  }, [isPointedAt]);
  return { element, isPointedAt };
}

export function RemarkItem({ remark, about, acts }: Properties) {
  const { id, text, raisedBy, raisedAt, closedAt, answers, label, mayAnswer, mayClose } = remark;
  const [isAnswering, setAnswering] = useState(false);
  const { element, isPointedAt } = usePointedAt(id);
  const { answer, close } = acts;
  return (
    <li
      ref={element}
      id={remarkAnchor(id)}
      tabIndex={-1}
      className={`remark${closedAt ? ' is-closed' : ''}${isPointedAt ? ' is-pointed-at' : ''}`}
    >
      <div className="remark-head">
        <span className="remark-state">{closedAt ? '✓ closed' : answers.length > 0 ? '◐ answered' : '○ open'}</span>
        <b>{about}</b>
        <small>
          {raisedBy} on revision {label}, <Moment at={raisedAt} />
        </small>
      </div>
      <p className="remark-text">{text}</p>
      {answers.length > 0 && (
        <ul className="remark-answers">
          {answers.map((one) => (
            <li key={one.id}>
              <small>
                {one.by}, <Moment at={one.at} />
              </small>
              <p className="remark-text">{one.text}</p>
            </li>
          ))}
        </ul>
      )}
      {closedAt && (
        <small className="soft">
          closed by {raisedBy}, <Moment at={closedAt} />
        </small>
      )}
      {isAnswering ? (
        <AnswerForm
          label={`Answer to the remark of ${raisedBy}`}
          submit={(words) => answer.mutateAsync({ remarkId: id, text: words })}
          onEnd={() => setAnswering(false)}
        />
      ) : (
        (mayAnswer || mayClose) && (
          <div className="remark-acts">
            {mayAnswer && (
              <Button size="small" onClick={() => setAnswering(true)}>
                Answer
              </Button>
            )}
            {mayClose && (
              <Button size="small" loading={close.isPending} onClick={() => close.mutate(id)}>
                Close it
              </Button>
            )}
          </div>
        )
      )}
      {close.error && close.variables === id && (
        <p className="bg-field-error" role="alert">
          {failureText(close.error)}
        </p>
      )}
    </li>
  );
}
