import { Input } from 'antd';
import { memo, useState } from 'react';
import { FieldFrame, noteIdOf, type FieldWords } from './field-frame';

export interface DateFieldProperties extends FieldWords {
  path: string;
  /** YYYY-MM-DD */
  value: string | null;
  unread?: string | undefined;
  onChange: (path: string, value: string | null, unread: string | undefined) => void;
  onLeave?: ((path: string) => void) | undefined;
}

/** A day that exists, as YYYY-MM-DD; null where the text is none. */
export function readDay(text: string): string | null {
  const parts = /^(\d{4})[-./ ](\d{1,2})[-./ ](\d{1,2})$/.exec(text.trim());
  if (!parts) return null;
  const day = `${parts[1]}-${parts[2]?.padStart(2, '0')}-${parts[3]?.padStart(2, '0')}`;
  const date = new Date(`${day}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(day) ? day : null;
}

/** A day, typed year first, so that day and month cannot be mixed up; what cannot be read stays as typed. */
export const DateField = memo(function DateField({
  path,
  value,
  unread,
  onChange,
  onLeave,
  readOnly,
  ...words
}: DateFieldProperties) {
  const [typed, setTyped] = useState(unread ?? value ?? '');
  const [busy, setBusy] = useState(false);
  const means = typed.trim() === '' ? null : (readDay(typed) ?? undefined);
  const text = (means === undefined ? unread === typed : unread === undefined && means === value)
    ? typed
    : (unread ?? value ?? '');
  const unreadable = text.trim() !== '' && readDay(text) === null;
  const error = unreadable ? !busy && 'Write the day as year-month-day, such as 2027-10-31' : words.error;
  return (
    <FieldFrame {...words} error={error}>
      <Input
        id={words.id}
        className="bg-figure-input"
        value={text}
        readOnly={readOnly}
        placeholder="year-month-day"
        autoComplete="off"
        status={error ? 'error' : ''}
        aria-invalid={error ? true : undefined}
        aria-describedby={error || words.note || words.mark ? noteIdOf(words.id) : undefined}
        onChange={({ target }) => {
          setTyped(target.value);
          setBusy(true);
          const day = readDay(target.value);
          if (target.value.trim() === '') onChange(path, null, undefined);
          else if (day) onChange(path, day, undefined);
          else onChange(path, value, target.value);
        }}
        onBlur={() => {
          setBusy(false);
          onLeave?.(path);
        }}
      />
    </FieldFrame>
  );
});
