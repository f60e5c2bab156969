import { Button, Input } from 'antd';
import { memo, useEffect, useState, type ReactNode } from 'react';
import { browserDecimalSign, editedText, type DecimalSign } from './decimal-sign';
import { FieldFrame, noteIdOf, type FieldWords } from './field-frame';
import { readNumber, type NumberReading } from './read-number';

/** While a text is still being typed its faults are not yet called out; they are after this pause or on leaving. */
const PATIENCE_MS = 700;

export interface NumberFieldProperties extends FieldWords {
  path: string;
  value: number | null;
  /** Text that could not be read, kept as it was typed; undefined where the field can be read. */
  unread?: string | undefined;
  /** `unread` is the text where it cannot be read as a figure of this field; the value is then the last one that was. */
  onChange: (path: string, value: number | null, unread: string | undefined) => void;
  onLeave?: ((path: string) => void) | undefined;
}

function meansTheSame(text: string, reading: NumberReading, value: number | null, unread: string | undefined): boolean {
  if (reading.kind === 'empty') return value === null && unread === undefined;
  if (reading.kind === 'number') return Object.is(reading.value, value) && unread === undefined;
  return unread === text;
}

function useFieldText(value: number | null, unread: string | undefined, unit: string | undefined, sign: DecimalSign) {
  const [text, setText] = useState(() => unread ?? editedText(value, sign));
  const reading = readNumber(text, { sign, unit });
  if (meansTheSame(text, reading, value, unread)) return { text, reading, setText };
  // The form changed under the text (a reload, a choice in a conflict, back to basis): the form is right.
  const fresh = unread ?? editedText(value, sign);
  return { text: fresh, reading: readNumber(fresh, { sign, unit }), setText };
}

/** A number exactly as typed: no rounding, no stepping by wheel or arrows, faults beside the field and the text kept. */
export const NumberField = memo(function NumberField({
  path,
  value,
  unread,
  onChange,
  onLeave,
  readOnly,
  ...words
}: NumberFieldProperties) {
  const sign = browserDecimalSign();
  const { text, reading, setText } = useFieldText(value, unread, words.unit, sign);
  const [patient, setPatient] = useState(false);
  useEffect(() => {
    if (!patient) return undefined;
    const timer = setTimeout(() => setPatient(false), PATIENCE_MS);
    return () => clearTimeout(timer);
  }, [patient, text]);

  const take = (typed: string) => {
    const next = readNumber(typed, { sign, unit: words.unit });
    setText(typed);
    setPatient(true);
    if (next.kind === 'empty') onChange(path, null, undefined);
    else if (next.kind === 'number') onChange(path, next.value, undefined);
    else onChange(path, value, typed);
  };

  let fault: ReactNode = words.error;
  if (reading.kind === 'conversion') {
    fault = (
      <>
        {`${reading.typed} ${reading.typedUnit} is ${editedText(reading.value, sign)} ${reading.unit}. `}
        <Button type="link" size="small" onClick={() => take(editedText(reading.value, sign))}>
          {`Use ${editedText(reading.value, sign)} ${reading.unit}`}
        </Button>
      </>
    );
  } else if (reading.kind === 'unreadable') {
    fault = patient ? undefined : reading.message;
  }

  return (
    <FieldFrame {...words} error={fault}>
      <Input
        id={words.id}
        type="text"
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        className="bg-figure-input"
        value={text}
        readOnly={readOnly}
        status={fault ? 'error' : ''}
        suffix={words.unit && <span aria-hidden="true">{words.unit}</span>}
        aria-invalid={fault ? true : undefined}
        aria-describedby={fault || words.note || words.mark ? noteIdOf(words.id) : undefined}
        onChange={(event) => take(event.target.value)}
        onBlur={() => {
          setPatient(false);
          onLeave?.(path);
        }}
      />
    </FieldFrame>
  );
});
