import { Input } from 'antd';
import { memo } from 'react';
import { FieldFrame, noteIdOf, type FieldWords } from './field-frame';

export interface TextFieldProperties extends FieldWords {
  path: string;
  value: string;
  onChange: (path: string, value: string) => void;
  onLeave?: ((path: string) => void) | undefined;
  placeholder?: string | undefined;
  maxLength?: number | undefined;
}

export const TextField = memo(function TextField({
  path,
  value,
  onChange,
  onLeave,
  placeholder,
  maxLength,
  readOnly,
  ...words
}: TextFieldProperties) {
  return (
    <FieldFrame {...words}>
      <Input
        id={words.id}
        value={value}
        placeholder={placeholder}
        maxLength={maxLength}
        readOnly={readOnly}
        autoComplete="off"
        status={words.error ? 'error' : ''}
        aria-invalid={words.error ? true : undefined}
        aria-describedby={words.error || words.note || words.mark ? noteIdOf(words.id) : undefined}
        onChange={(event) => onChange(path, event.target.value)}
        onBlur={() => onLeave?.(path)}
      />
    </FieldFrame>
  );
});
