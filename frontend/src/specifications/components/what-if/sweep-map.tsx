import type { InsulatorUnit, Severity, Sweep } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { useMemo, useRef, useState, type KeyboardEvent } from 'react';
import { failureText } from '../../../api/api-error';
import { SeverityShape } from '../../../ui/caution';
import { formatNumber } from '../../../ui/figure';
import type { Answer } from '../../hooks/use-live-evaluation';
import { siteClass, sweepAltitudes, sweepClasses } from '../../model/what-if';
import { useSweep } from '../../queries/use-what-if';

type Cell = Sweep['cells'][number];
/** Share of the accent in the cell with the most units; the ink stays readable on it in both themes. */
const DEEPEST_PERCENT = 46;

interface Properties {
  answer: Answer;
  unit: InsulatorUnit | null;
}

/** Units by altitude and class for the chosen unit. */
export function SweepPart({ answer, unit }: Properties) {
  const { input } = answer;
  const siteM = input.site?.altitudeM ?? null;
  const altitudes = useMemo(() => sweepAltitudes(siteM), [siteM]);
  const classes = useMemo(() => sweepClasses(input), [input]);
  const names = useMemo(() => classes.map(({ value }) => value), [classes]);
  const { data, error } = useSweep(answer, altitudes, unit ? names : []);
  const open = !unit ? 'Choose a unit first.' : classes.length === 0 ? 'Choose the basis first.' : null;
  return (
    <section aria-labelledby="what-if-sweep">
      <h3 id="what-if-sweep">Units by altitude and class{unit && <span> {unit.code}</span>}</h3>
      {open && <p className="zone-note">{open}</p>}
      {error && <p className="bg-field-error">{failureText(error)}</p>}
      {!open && !data && !error && <p className="zone-note">Working it out…</p>}
      {!open && data && (
        <SweepGrid
          cells={data.cells as Cell[]}
          altitudes={altitudes}
          classes={classes}
          siteM={siteM}
          siteClass={siteClass(input)}
        />
      )}
    </section>
  );
}

interface GridProperties {
  cells: readonly Cell[];
  altitudes: readonly number[];
  classes: readonly { value: string; label: string }[];
  siteM: number | null;
  siteClass: string | null;
}

const STEPS: Record<string, readonly [rows: number, columns: number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

const clamp = (value: number, most: number): number => Math.min(most, Math.max(0, value));

function SweepGrid({ cells, altitudes, classes, siteM, siteClass: own }: GridProperties) {
  const table = useRef<HTMLTableElement>(null);
  const home = [
    Math.max(
      0,
      classes.findIndex(({ value }) => value === own),
    ),
    Math.max(
      0,
      altitudes.findIndex((altitude) => altitude === siteM),
    ),
  ] as const;
  const [[row, column], setAt] = useState<readonly [number, number]>(home);
  const counts = cells.flatMap(({ units }) => (units === null ? [] : [units]));
  const [least, most] = [Math.min(...counts), Math.max(...counts)];
  const cellOf = (name: string, altitude: number) =>
    cells.find((one) => one.class === name && one.altitudeM === altitude);

  const go = (nextRow: number, nextColumn: number) => {
    const at = [clamp(nextRow, classes.length - 1), clamp(nextColumn, altitudes.length - 1)] as const;
    setAt(at);
    table.current?.querySelector<HTMLElement>(`[data-cell="${at[0]}-${at[1]}"]`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const step = STEPS[event.key];
    if (step) go(row + step[0], column + step[1]);
    else if (event.key === 'Home') go(row, 0);
    else if (event.key === 'End') go(row, altitudes.length - 1);
    else return;
    event.preventDefault();
  };

  const chosen = cellOf(classes[row]?.value ?? '', altitudes[column] ?? NaN);
  return (
    <>
      <div className="sweep-frame">
        <table className="sweep" role="grid" ref={table} onKeyDown={onKeyDown} aria-labelledby="what-if-sweep">
          <thead>
            <tr>
              <th scope="col">altitude, m</th>
              {altitudes.map((altitude) => (
                <th scope="col" key={altitude} className={altitude === siteM ? 'is-site' : undefined}>
                  {formatNumber(altitude)}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {classes.map(({ value, label }, atRow) => (
              <tr key={value}>
                <th scope="row" className={value === own ? 'is-site' : undefined}>
                  {label}
                </th>
                {altitudes.map((altitude, atColumn) => {
                  const cell = cellOf(value, altitude);
                  const isHere = atRow === row && atColumn === column;
                  const isSite = altitude === siteM && value === own;
                  const share = cell?.units == null || most === least ? 0 : (cell.units - least) / (most - least);
                  return (
                    <td
                      key={altitude}
                      role="gridcell"
                      data-cell={`${atRow}-${atColumn}`}
                      tabIndex={isHere ? 0 : -1}
                      className={isSite ? 'is-site' : undefined}
                      style={{ '--share': `${Math.round(share * DEEPEST_PERCENT)}%` } as React.CSSProperties}
                      onFocus={() => setAt([atRow, atColumn])}
                      onClick={() => go(atRow, atColumn)}
                    >
                      <CellWords cell={cell} isSite={isSite} />
                    </td>
                  );
                })}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="sweep-words" aria-live="polite">
        {chosen && cellWords(chosen, classes[row]?.label ?? '')}
      </p>
      <p className="zone-note">
        Framed: the present site. Deeper colour: more units. A mark beside a count: <SeverityShape severity="fail" />{' '}
        fail, <SeverityShape severity="stop" /> stop, <SeverityShape severity="acceptance" /> needs acceptance. Arrow
        keys move over the table.
      </p>
    </>
  );
}

const MARKED: readonly Severity[] = ['stop', 'fail', 'acceptance'];

function CellWords({ cell, isSite }: { cell: Cell | undefined; isSite: boolean }) {
  const worst = cell?.worst ?? null;
  const isMarked = worst !== null && MARKED.includes(worst);
  return (
    <>
      <span className="bg-num">{cell?.units ?? '—'}</span>
      {isMarked && <SeverityShape severity={worst} />}
      <span className="bg-hidden">
        {cell?.units == null && ' no count'}
        {isMarked && `, ${CHOICE_LABELS.severity[worst].toLowerCase()}`}
        {isSite && ', present site'}
      </span>
    </>
  );
}

function cellWords({ altitudeM, units, governedBy, worst }: Cell, label: string): string {
  const parts = [
    units === null ? 'no count' : `${units} ${units === 1 ? 'unit' : 'units'}`,
    governedBy === null ? null : `${CHOICE_LABELS.criterion[governedBy].toLowerCase()} governs`,
    worst === null ? null : `gravest caution: ${CHOICE_LABELS.severity[worst].toLowerCase()}`,
  ];
  return `${formatNumber(altitudeM)} m, class ${label}: ${parts.filter(Boolean).join(', ')}.`;
}
