import type { Caution, Severity } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import './caution.css';

const SHAPES: Record<Severity, string> = {
  stop: 'M4 .8h4l3.2 3.2v4L8 11.2H4L.8 8V4zM3.4 6h5.2',
  fail: 'M1.5 1.5l9 9M10.5 1.5l-9 9',
  acceptance: 'M6 .8L11.2 6 6 11.2.8 6zM6 3.6v3M6 8.2v.2',
  caution: 'M6 1.2L11.3 10.8H.7zM6 4.6v3M6 9.1v.2',
  info: 'M6 .8a5.2 5.2 0 1 0 0 10.4A5.2 5.2 0 1 0 6 .8zM6 5.2v3.4M6 3.4v.2',
};

/** The gravest first. */
export const SEVERITY_ORDER: readonly Severity[] = ['stop', 'fail', 'acceptance', 'caution', 'info'];

/** The severity as a shape of its own; the word stands beside it wherever it is used. */
export function SeverityShape({ severity }: { severity: Severity }) {
  return (
    <svg className={`severity is-${severity}`} viewBox="0 0 12 12" width="12" height="12" aria-hidden="true">
      <path d={SHAPES[severity]} fill="none" stroke="currentColor" strokeWidth="1.4" strokeLinejoin="round" />
    </svg>
  );
}

interface Properties {
  caution: Caution;
  /** Beside a field: without the field's name. */
  brief?: boolean;
}

export function CautionMark({ caution, brief = false }: Properties) {
  const Tag = brief ? 'div' : 'li';
  return (
    <Tag className={`caution is-${caution.severity}`}>
      <b>
        <SeverityShape severity={caution.severity} /> {CHOICE_LABELS.severity[caution.severity].toLowerCase()}
      </b>
      <span>{caution.text}</span>
    </Tag>
  );
}

/** What an answer warns of, the gravest first. */
export function CautionList({ cautions }: { cautions: readonly Caution[] }) {
  const sorted = [...cautions].sort((a, b) => SEVERITY_ORDER.indexOf(a.severity) - SEVERITY_ORDER.indexOf(b.severity));
  return (
    <ul className="cautions">
      {sorted.map((caution) => (
        <CautionMark key={caution.code + caution.text} caution={caution} />
      ))}
    </ul>
  );
}
