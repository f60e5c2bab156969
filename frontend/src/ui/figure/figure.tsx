import { memo, type ReactNode } from 'react';
import { useTraceOpener } from '../trace/trace-area';
import { formatNumber, type NumberFormat } from './format-number';
import './figure.css';

export interface FigureProperties extends NumberFormat {
  value: number | null | undefined;
  unit?: string | undefined;
  /** Basis of a voltage or of a figure per kV, in words. */
  basis?: string | undefined;
  /** Said in place of a figure that is not there. */
  why?: string | undefined;
  /** Name of the figure in the answer; with `traced`, the figure opens its working. */
  name?: string;
  /** What the figure is, for the button that opens its working. */
  label?: string;
  children?: ReactNode;
}

/** A value with unit and basis. What is not known is a dash with its reason, never a zero. */
export const Figure = memo(function Figure({
  value,
  unit,
  basis,
  why,
  name,
  label,
  children,
  ...format
}: FigureProperties) {
  const opener = useTraceOpener(name);
  if (value === null || value === undefined) {
    return (
      <span className="bg-figure is-unknown" title={why}>
        <span className="bg-num" aria-hidden="true">
          —
        </span>
        <span className="bg-hidden">not known</span>
        {why && <small> {why}</small>}
      </span>
    );
  }
  const shown = (
    <>
      <span className="bg-num">{formatNumber(value, format)}</span>
      {unit && <span className="bg-unit">{unit === '%' ? '\u00a0%' : `\u00a0${unit}`}</span>}
      {basis && <small> {basis}</small>}
      {children}
    </>
  );
  if (!opener) return <span className="bg-figure">{shown}</span>;
  return (
    <button
      type="button"
      className="bg-figure is-traced"
      aria-expanded={opener.isOpen}
      aria-controls={opener.isOpen ? opener.panelId : undefined}
      onClick={opener.toggle}
      title="How this figure comes about"
    >
      {label && <span className="bg-hidden">{label}: </span>}
      {shown}
    </button>
  );
});
