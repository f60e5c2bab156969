import { inFours, readVerificationCode } from '@bellgap/common/api';
import { Button, Input } from 'antd';
import { useRef, useState } from 'react';
import '../../ui/forms/forms.css';
import { codeFault, typedInFours } from '../model/typed-code';

interface CodeFormProps {
  label: string;
  submitLabel: string;
  autoFocus?: boolean;
  /** The code as it is printed. */
  ask: (code: string) => unknown;
}

/** The code from a print, typed with or without its hyphens. */
export function CodeForm({ label, submitLabel, autoFocus = false, ask }: CodeFormProps) {
  const [typed, setTyped] = useState('');
  const [fault, setFault] = useState<string | null>(null);
  const frame = useRef<HTMLFormElement>(null);
  return (
    <form
      ref={frame}
      noValidate
      className="verify-form"
      onSubmit={(event) => {
        event.preventDefault();
        const code = readVerificationCode(typed);
        setFault(codeFault(typed));
        if (code) ask(inFours(code));
        else frame.current?.querySelector('input')?.focus();
      }}
    >
      <div className={fault ? 'form-field is-faulty' : 'form-field'}>
        <label htmlFor="verification-code">{label}</label>
        <Input
          id="verification-code"
          className="num"
          value={typed}
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          autoFocus={autoFocus}
          status={fault ? 'error' : ''}
          aria-invalid={fault !== null}
          aria-describedby="verification-code-help"
          onChange={({ target }) => {
            setFault(null);
            // Within the code the caret would jump if hyphens were set.
            const atEnd = target.selectionStart === null || target.selectionStart === target.value.length;
            const grows = target.value.length > typed.length;
            setTyped(atEnd && grows ? typedInFours(target.value) : target.value.toUpperCase());
          }}
        />
        <div className="form-field-help" id="verification-code-help">
          {fault ?? 'Four times four signs, such as 7K2M-94QX-HV3N-C8TA'}
        </div>
      </div>
      <Button type="primary" htmlType="submit">
        {submitLabel}
      </Button>
    </form>
  );
}
