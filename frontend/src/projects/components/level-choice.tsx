import { contract, type InsulationLevelRow } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { useId } from 'react';
import { queryOf } from '../../api/queries';
import { QueryState } from '../../ui/states/query-state';
import { levelOf, rowsFor, sameLevel, type Level } from '../model/levels';
import './level-choice.css';

interface LevelChoiceProps {
  basis: 'iec' | 'north-american';
  highestVoltageKv: number;
  value: Level | null;
  fault: string | undefined;
  choose(level: Level | null): void;
}

function remarkOf(row: InsulationLevelRow): string {
  const remarks = [row.reason ?? ''];
  if (row.bracketed) remarks.push('in brackets: withstand between phases to be proved by further tests');
  remarks.push([row.source.document, row.source.clause].filter(Boolean).join(', '));
  return remarks.filter(Boolean).join(' · ');
}

interface LevelTableProps extends Omit<LevelChoiceProps, 'basis'> {
  rows: InsulationLevelRow[];
}

function LevelTable({ rows, highestVoltageKv, value, fault, choose }: LevelTableProps) {
  const name = useId();
  const shown = rowsFor(rows, highestVoltageKv);
  const tableVoltageKv = shown[0]?.highestVoltageKv;
  const switching = shown.some((row) => row.switchingKv !== null);
  const powerFrequency = shown.some((row) => row.powerFrequencyKv !== null);
  const stray = value !== null && !shown.some((row) => sameLevel(row, value));
  if (shown.length === 0) return <p className="soft">The table has no level for a highest voltage as high as this.</p>;
  return (
    <fieldset
      className="level-choice"
      aria-invalid={fault !== undefined}
      aria-describedby={fault ? `${name}-fault` : undefined}
    >
      <legend>
        <span>
          {tableVoltageKv === highestVoltageKv
            ? `One row of ${highestVoltageKv} kV`
            : `One row of ${tableVoltageKv} kV, the next higher voltage of the table`}
        </span>
      </legend>
      {stray && (
        <p className="level-choice-stray" role="alert">
          The level chosen so far (lightning {value.lightningKv ?? '—'} kV peak) is no row of this voltage. Choose one.
        </p>
      )}
      <div className="level-choice-scroll">
        <table>
          <thead>
            <tr>
              <th scope="col">
                <span className="visually-hidden">Chosen</span>
              </th>
              <th scope="col">Lightning, kV peak</th>
              {switching && <th scope="col">Switching, kV peak</th>}
              {powerFrequency && <th scope="col">Power frequency, kV rms</th>}
              <th scope="col" className="level-choice-remark">
                Source
              </th>
            </tr>
          </thead>
          <tbody>
            {shown.map((row) => {
              const key = [row.lightningKv, row.switchingKv, row.powerFrequencyKv, row.source.document].join('/');
              const chosen = sameLevel(row, value);
              return (
                <tr key={key} className={chosen ? 'is-chosen' : undefined} onClick={() => choose(levelOf(row))}>
                  <td>
                    <input
                      type="radio"
                      name={name}
                      checked={chosen}
                      onChange={() => choose(levelOf(row))}
                      aria-label={`Lightning ${row.lightningKv} kV peak${row.switchingKv ? `, switching ${row.switchingKv} kV peak` : ''}${row.powerFrequencyKv ? `, power frequency ${row.powerFrequencyKv} kV` : ''}`}
                    />
                  </td>
                  <td className="num">{row.lightningKv}</td>
                  {switching && <td className="num">{row.switchingKv ?? '—'}</td>}
                  {powerFrequency && <td className="num">{row.powerFrequencyKv ?? '—'}</td>}
                  <td className="level-choice-remark">{remarkOf(row)}</td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      {fault && (
        <p className="level-choice-fault" id={`${name}-fault`}>
          {fault}
        </p>
      )}
    </fieldset>
  );
}

/** One row of the standard insulation levels, chosen whole: its voltages are proved together. */
export function LevelChoice({ basis, ...table }: LevelChoiceProps) {
  const levels = useQuery({ ...queryOf(contract.insulationLevels, { query: { basis } }), staleTime: 300_000 });
  return (
    <QueryState query={levels} what="The insulation levels">
      {(rows) => <LevelTable rows={rows} {...table} />}
    </QueryState>
  );
}
