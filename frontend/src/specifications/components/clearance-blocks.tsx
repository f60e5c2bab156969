import type { ClearanceRow, Evaluation } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { SourceWords, TraceArea } from '../../ui/trace';
import { useLit } from '../hooks/highlight';
import { clearanceName } from '../model/trace-names';
import { whyNot } from '../model/words';
import { lowerFirst } from './criteria-block';
import { LedgerBlock } from './ledger-rows';
import { SafetyBlock } from './safety-block';

const BLOCKS = [
  { distance: 'phase-to-earth', title: 'Distance to earth', missing: ['clearances.phaseToEarthMm', 'clearances'] },
  {
    distance: 'phase-to-phase',
    title: 'Distance between phases',
    missing: ['clearances.phaseToPhaseMm', 'clearances'],
  },
  { distance: 'section', title: 'Section clearance', missing: ['clearances.section'] },
] as const;

const STRESSES: Record<string, string> = {
  lightning: 'lightning',
  'fast-front': 'fast front',
  switching: 'switching',
  'slow-front': 'slow front',
  'power-frequency': 'power frequency',
};

/** Four different distances in four blocks; none of them is worked out from another. */
export function ClearanceBlocks({ evaluation }: { evaluation: Evaluation }) {
  const rows = evaluation.clearances?.rows ?? [];
  return (
    <>
      {BLOCKS.map(({ distance, title, missing }) => (
        <ClearanceBlock
          key={distance}
          title={title}
          rows={rows.filter((row) => row.distance === distance)}
          headlineMm={headlineOf(evaluation, distance)}
          why={whyNot(evaluation, ...missing)}
          besideNotes={distance === 'section' ? [] : besideNotes(evaluation, distance)}
        />
      ))}
      <SafetyBlock evaluation={evaluation} />
    </>
  );
}

function headlineOf({ clearances }: Evaluation, distance: ClearanceRow['distance']): number | null {
  if (distance === 'phase-to-earth') return clearances?.phaseToEarthMm ?? null;
  if (distance === 'phase-to-phase') return clearances?.phaseToPhaseMm ?? null;
  return null;
}

/** Why the other methods have no figure for a distance. */
function besideNotes({ clearances }: Evaluation, distance: 'phase-to-earth' | 'phase-to-phase'): string[] {
  const reasons = (clearances?.besideWhyNot ?? []).filter((one) => one.distance === distance);
  return reasons.map(({ method, why }) => {
    const asked = method === 'en-theoretical' ? ONLY_WITH_THEORETICAL : '';
    return `${CHOICE_LABELS.clearanceMethod[method]}, no figure beside: ${lowerFirst(why)}${asked}`;
  });
}

const ONLY_WITH_THEORETICAL = ` ${['clearance.enGap', 'clearance.fastFrontFrom']
  .map((path) => `“${fieldOf(path)?.label}”`)
  .join(' and ')} are asked only with that method.`;

interface Properties {
  title: string;
  rows: ClearanceRow[];
  headlineMm: number | null;
  why: string | undefined;
  besideNotes: string[];
}

function ClearanceBlock({ title, rows, headlineMm, why, besideNotes }: Properties) {
  const aside =
    headlineMm === null ? undefined : (
      <>
        needed <Figure value={headlineMm} unit="mm" round="up" />
      </>
    );
  const absence = why ? `not assessed: ${lowerFirst(why)}` : 'not covered by this sheet';
  return (
    <LedgerBlock title={title} aside={aside}>
      {rows.length === 0 ? (
        <p className="zone-note">{absence}</p>
      ) : (
        <TraceArea>
          <table className="ledger-table">
            <thead>
              <tr>
                <th scope="col">stress and shape</th>
                <th scope="col">withstand</th>
                <th scope="col">altitude</th>
                <th scope="col">needed</th>
              </tr>
            </thead>
            {rows.map((row, index) => (
              <Row key={`${row.method} ${row.stress} ${row.shape} ${index}`} row={row} />
            ))}
          </table>
          {besideNotes.map((note) => (
            <p key={note} className="zone-note">
              {note}
            </p>
          ))}
        </TraceArea>
      )}
    </LedgerBlock>
  );
}

function shapeWords(shape: string | null): string | null {
  if (shape === null) return null;
  const known: Record<string, string> = {
    ...CHOICE_LABELS.shapePhaseToEarth,
    ...CHOICE_LABELS.shapePhaseToPhase,
    ...CHOICE_LABELS.enGap,
  };
  return (known[shape] ?? shape.replaceAll('-', ' ')).toLowerCase();
}

function Row({ row }: { row: ClearanceRow }) {
  const lit = useLit(row.distance === 'phase-to-earth' && row.governs ? 'clearances.phaseToEarthMm' : undefined);
  const shape = shapeWords(row.shape);
  const stress = STRESSES[row.stress] ?? row.stress.replaceAll('-', ' ');
  const remarks = [
    CHOICE_LABELS.clearanceMethod[row.method],
    ...(row.interpolated ? ['interpolated'] : []),
    ...(row.withinSource ? [] : ['outside of the source']),
    ...(row.h0M !== null && row.altitudeFactor !== null ? [`altitude counted above ${row.h0M} m`] : []),
  ];
  const unit = row.stress === 'power-frequency' ? 'kV' : 'kV peak';
  const standing = row.governs ? 'is-governing' : undefined;
  return (
    <tbody className={standing} {...lit}>
      <tr>
        <th scope="row">
          {stress}
          {shape && `, ${shape}`}
          {row.governs && <small className="governs-word"> governs</small>}
        </th>
        <td>
          <Figure value={row.withstandKv} unit={unit} />
        </td>
        <td>
          <Figure value={row.altitudeFactor} decimals={3} />
        </td>
        <td>
          <Figure
            value={row.valueMm}
            unit="mm"
            round="up"
            name={clearanceName(row)}
            label={`${stress}, needed`}
            why={row.withinSource ? undefined : 'beyond the source'}
          />
        </td>
      </tr>
      <tr className="row-source">
        <td colSpan={4}>
          <small>
            {remarks.join(', ')} — <SourceWords source={row.source} />
          </small>
        </td>
      </tr>
    </tbody>
  );
}
