import type { WorksheetAnswer, WorksheetRow } from '@bellgap/common/api';
import { WORKSHEET_CHOICES, WORKSHEET_WORDS } from '@bellgap/common/schemas';
import { Figure } from '../../../ui/figure';

function whatWords({ stress, place }: WorksheetRow): string {
  return [WORKSHEET_WORDS.stress[stress], place && WORKSHEET_CHOICES.place[place].toLowerCase()]
    .filter(Boolean)
    .join(', ');
}

function Converted({ row }: { row: WorksheetRow }) {
  const figures = [
    ['power frequency', row.convertedPowerFrequencyKvRms, 'kV rms'],
    ['lightning', row.convertedLightningKvPeak, 'kV peak'],
    ['switching', row.convertedSwitchingKvPeak, 'kV peak'],
  ] as const;
  return figures
    .filter(([, value]) => value !== null)
    .map(([name, value, unit]) => (
      <div key={name}>
        <small>{name} </small>
        <Figure value={value} unit={unit} decimals={1} />
      </div>
    ));
}

/** Every requirement from the representative overvoltage to what a standard level has to reach. */
export function RequirementsTable({ answer }: { answer: WorksheetAnswer }) {
  if (answer.rows.length === 0) return null;
  return (
    <div className="worksheet-scroll" role="region" aria-label="Requirements" tabIndex={0}>
      <table className="worksheet-table">
        <thead>
          <tr>
            <th scope="col">overvoltage</th>
            <th scope="col">insulation</th>
            <th scope="col">representative</th>
            <th scope="col">co-ordination</th>
            <th scope="col">altitude</th>
            <th scope="col">required</th>
            <th scope="col">converted to</th>
          </tr>
        </thead>
        <tbody>
          {answer.rows.map((row) => (
            <tr key={[row.stress, row.insulation, row.place, row.distance].join(' ')}>
              <th scope="row">
                {whatWords(row)}, {WORKSHEET_WORDS.distance[row.distance]}
              </th>
              <td>
                {WORKSHEET_WORDS.insulation[row.insulation].replace(' insulation', '')}
                {row.metByClearance && <small> met by a clearance</small>}
              </td>
              <td>
                <Figure value={row.representativeKv} unit={row.unit} decimals={1} />
              </td>
              <td>
                <Figure value={row.coordinationKv} unit={row.unit} decimals={1}>
                  <small> × {row.coordinationFactor.toFixed(2)}</small>
                </Figure>
              </td>
              <td>
                {row.altitudeFactor === null ? <small>none</small> : <Figure value={row.altitudeFactor} decimals={3} />}
              </td>
              <td>
                <Figure value={row.requiredKv} unit={row.unit} decimals={1}>
                  <small> safety {row.safetyFactor}</small>
                </Figure>
              </td>
              <td>
                <Converted row={row} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
