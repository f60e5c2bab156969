import type { SourceReference, TraceLine } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { formatFull } from '../figure/format-number';
import type { TraceSource } from './trace-source';
import './trace.css';

/** A citation in words, with how well the figure is known. */
export function SourceWords({ source }: { source: SourceReference }) {
  const where = [
    [source.document, source.edition].filter((part) => part !== '' && part !== 'none').join(':'),
    source.clause,
  ]
    .filter(Boolean)
    .join(', ');
  const status = CHOICE_LABELS.status[source.status];
  // "Common practice, no published source" is both the citation and its status.
  const words = where.toLowerCase().includes(status.toLowerCase()) ? where : `${where} · ${status}`;
  return <span className={`bg-source is-${source.status}`}>{words}</span>;
}

function resultText({ result, unit }: TraceLine): string | null {
  if (result === null) return null;
  const figure = typeof result === 'number' ? formatFull(result) : result;
  return unit ? `${figure} ${unit}` : figure;
}

/** One step of a calculation; `of` says what it is for, where several steps share a heading. */
export function TraceStep({ line, of }: { line: TraceLine; of?: string }) {
  const result = resultText(line);
  return (
    <div className="bg-trace-line">
      <div className="bg-trace-heading">
        {line.heading}
        {of && <span className="bg-trace-of">, {of}</span>}
      </div>
      {line.formula && <div className="bg-num bg-trace-formula">{line.formula}</div>}
      {line.substitution && line.substitution !== line.formula && <div className="bg-num">{line.substitution}</div>}
      <div className="bg-num bg-trace-result">{result === null ? 'no figure' : `= ${result}`}</div>
      <SourceWords source={line.source} />
    </div>
  );
}

/** Formula, figures put in, unrounded result and source of one figure. */
export function TraceLines({ source, name }: { source: TraceSource; name: string }) {
  if (source.failure !== null) return <p className="bg-field-error">{source.failure}</p>;
  if (source.lines === null) return <p className="bg-trace-wait">Fetching the working…</p>;
  const lines = source.linesOf(name, source.lines);
  if (lines.length === 0) return <p className="bg-trace-wait">This figure has no working in the present answer.</p>;
  return (
    <>
      {lines.map((line) => (
        <TraceStep key={line.id} line={line} />
      ))}
    </>
  );
}
