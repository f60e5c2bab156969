import type { Approval } from '@bellgap/common/api';
import type { ReactNode } from 'react';
import { SeverityShape } from '../../ui/caution';

interface MattersProps {
  anchor: string;
  title: string;
  /** What is asked of the approver. */
  asks: string;
  severity: 'acceptance' | 'fail' | 'caution';
  matters: readonly { code: string; text: string }[];
  /** Fields under each matter. */
  fields?: ((index: number) => ReactNode) | undefined;
  /** Fields under all of them. */
  children?: ReactNode;
}

/** What the approver takes upon himself, each with the fields in which he says why. */
export function Matters({ anchor, title, asks, severity, matters, fields, children }: MattersProps) {
  if (matters.length === 0) return null;
  return (
    <section id={anchor} className="matters" aria-labelledby={`${anchor}-title`}>
      <h3 id={`${anchor}-title`}>{title}</h3>
      <p className="soft">{asks}</p>
      <ol>
        {matters.map(({ code, text }, index) => (
          <li key={code + text}>
            <p>
              <SeverityShape severity={severity} /> {text}
            </p>
            {fields?.(index)}
          </li>
        ))}
      </ol>
      {children}
    </section>
  );
}

/** The same without fields, for those who look on. */
export function MattersToRead({ approval: { acceptances, fails, laterChanges } }: { approval: Approval }) {
  return (
    <>
      <Matters
        anchor="acceptances"
        title="Outside limits"
        asks="Needs a recorded reason of the approver."
        severity="acceptance"
        matters={acceptances}
      />
      <Matters
        anchor="fails"
        title="Failing"
        asks="Needs a concession of the approver, with its end."
        severity="fail"
        matters={fails}
      />
      <Matters
        anchor="later"
        title="Newer since it was submitted"
        asks="Needs the approver’s reason for not waiting."
        severity="caution"
        matters={laterChanges}
      />
    </>
  );
}
