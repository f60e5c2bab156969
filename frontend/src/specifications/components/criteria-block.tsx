import type { CriterionResult, Evaluation, InsulatorUnit } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { useLit } from '../hooks/highlight';
import { criterionWords, whyNot } from '../model/words';
import { LedgerBlock } from './ledger-rows';

interface Properties {
  evaluation: Evaluation;
  kind: InsulatorUnit['kind'] | null;
}

/** Units, or for rods and posts the margin, by each criterion; what governs stands out in colour, weight and words. */
export function CriteriaBlock({ evaluation, kind }: Properties) {
  const { string } = evaluation;
  const isRod = kind !== null && kind !== 'cap-and-pin';
  const title = kind === 'line-post' ? 'Post by criterion' : isRod ? 'Rod by criterion' : 'Units by criterion';
  if (!string) {
    return (
      <LedgerBlock title={title}>
        <p className="zone-note">
          Each criterion shows its own count here as soon as the site and the string are described.
        </p>
      </LedgerBlock>
    );
  }
  const shown = string.criteria.filter(({ state }) => state !== 'not-applicable');
  const most = Math.max(1, ...shown.map(({ requiredUnits }) => requiredUnits ?? 0));
  const governing = new Set([string.governedBy, ...string.tiedWith]);
  return (
    <LedgerBlock title={title}>
      <TraceArea>
        <table className="ledger-table criteria">
          <thead>
            <tr>
              <th scope="col">criterion</th>
              <th scope="col">needed</th>
              <th scope="col">given</th>
              {!isRod && <th scope="col">units</th>}
              <th scope="col">margin</th>
            </tr>
          </thead>
          <tbody>
            {shown.map((result) => (
              <CriterionRow
                key={result.criterion}
                result={result}
                governs={governing.has(result.criterion)}
                share={(result.requiredUnits ?? 0) / most}
                why={whyNot(evaluation, `string.${result.criterion}`)}
                isRod={isRod}
              />
            ))}
          </tbody>
        </table>
      </TraceArea>
      {(string.extraUnits ?? 0) > 0 && (
        <p className="zone-note">
          {string.unitsBeforeExtra} by criterion and {string.extraUnits} extra{' '}
          {string.extraUnits === 1 ? 'unit' : 'units'} in the string make {string.units}.
        </p>
      )}
    </LedgerBlock>
  );
}

interface RowProperties {
  result: CriterionResult;
  governs: boolean;
  share: number;
  why: string | undefined;
  isRod: boolean;
}

function CriterionRow({ result, governs, share, why, isRod }: RowProperties) {
  const { criterion, state, requiredValue, providedValue, unit, requiredUnits, marginPercent, verdict } = result;
  const lit = useLit(
    criterion === 'lightning' || criterion === 'switching' ? 'string.dryArcWithDevicesMm' : 'string.units',
  );
  const name = criterionWords(criterion);
  const traced = `string.criteria.${criterion}`;
  const head = (
    <th scope="row">
      {name}
      {governs && <small className="governs-word"> governs</small>}
      {!isRod && (
        <span className="bar-track" aria-hidden="true">
          <b style={{ width: `${Math.round(share * 100)}%` }} />
        </span>
      )}
    </th>
  );
  if (state === 'not-assessed') {
    return (
      <tr className="is-unassessed">
        {head}
        <td colSpan={isRod ? 3 : 4} className="why">
          not assessed{why && `: ${lowerFirst(why)}`}
        </td>
      </tr>
    );
  }
  const decimals = unit === 'mm' ? 0 : 1;
  return (
    <tr className={governs ? 'is-governing' : undefined} {...lit}>
      {head}
      <td>
        <Figure
          value={requiredValue}
          unit={unit}
          decimals={decimals}
          round="up"
          name={traced}
          label={`${name}, needed`}
        />
      </td>
      <td>
        <Figure value={providedValue} unit={unit} decimals={decimals} round="down" />
      </td>
      {!isRod && (
        <td>
          <Figure value={requiredUnits} name={traced} label={`${name}, units`} />
        </td>
      )}
      <td>
        <Figure value={marginPercent} unit="%" decimals={1} round="down" />
        {verdict === 'short' && (
          <span className="verdict is-short"> ✕ {CHOICE_LABELS.verdict.short.toLowerCase()}</span>
        )}
      </td>
    </tr>
  );
}

export const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
