import { Form } from 'antd';
import type { ReactNode } from 'react';
import './fields.css';

/** What every field shows around its control. */
export interface FieldWords {
  /** Id of the control; the label points at it. */
  id: string;
  label: string;
  /** Basis of a voltage, said with the label. */
  basis?: string | undefined;
  unit?: string | undefined;
  /** A fault, in words, shown beside the field. */
  error?: ReactNode;
  /** A remark that is no fault. */
  note?: ReactNode;
  /** The figure comes from the design basis unchanged: drawn as part of the sheet, not as an empty box. */
  inherited?: boolean | undefined;
  /** The figure differs from the design basis: turned corner, and words in `note`. */
  overridden?: boolean | undefined;
  /** A severity of the answer that points at this field. */
  mark?: ReactNode;
  readOnly?: boolean | undefined;
  /** The control needs more room than a figure does. */
  wide?: boolean | undefined;
}

export const noteIdOf = (id: string): string => `${id}-note`;

interface Properties extends Omit<FieldWords, 'readOnly'> {
  children: ReactNode;
}

export function FieldFrame({
  id,
  label,
  basis,
  unit,
  error,
  note,
  inherited = false,
  overridden = false,
  mark,
  wide = false,
  children,
}: Properties) {
  const standing = overridden ? 'is-overridden' : inherited ? 'is-inherited' : '';
  return (
    <div className={`bg-field ${standing}${wide ? ' is-wide' : ''}`} data-field={id}>
      <Form.Item
        htmlFor={id}
        colon={false}
        validateStatus={error ? 'error' : ''}
        label={
          <span>
            {label}
            {basis && <small> {basis}</small>}
            {unit && <span className="bg-hidden">, in {unit}</span>}
          </span>
        }
      >
        <span className="bg-field-control">{children}</span>
      </Form.Item>
      {(error || note || mark) && (
        <div className="bg-field-note" id={noteIdOf(id)}>
          {error && <div className="bg-field-error">{error}</div>}
          {mark}
          {note}
        </div>
      )}
    </div>
  );
}
