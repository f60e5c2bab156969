import type { Evaluation, MechanicalCaseResult } from '@bellgap/common/api';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { Figure } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import { caseName } from '../model/trace-names';
import { whyNot } from '../model/words';
import { lowerFirst } from './criteria-block';
import { LedgerBlock, LedgerRow } from './ledger-rows';

/** Loads of each case, what strength they ask for, and whether the chosen unit has it. */
export function MechanicalBlock({ evaluation }: { evaluation: Evaluation }) {
  const { mechanical } = evaluation;
  if (!mechanical) return null;
  const { cases, governedBy, strengthRequiredKn, classRequiredKn, coupling } = mechanical;
  const why = evaluation.notAssessed.find(({ part }) => part === 'mechanical')?.why;
  const bent = cases.some(({ post }) => post);
  return (
    <LedgerBlock
      title="Mechanical loads"
      aside={bent ? 'of the whole set, and of one post' : 'of the whole set, and of one string'}
    >
      {why && <p className="zone-note">not assessed: {lowerFirst(why)}</p>}
      <TraceArea>
        {cases.length > 0 && (
          <table className="ledger-table">
            <thead>
              <tr>
                <th scope="col">case</th>
                <th scope="col">{bent ? 'a post, bending' : 'a string'}</th>
                <th scope="col">factor needed</th>
                <th scope="col">given</th>
              </tr>
            </thead>
            {cases.map((one, index) => (
              <CaseRows key={index} result={one} index={index} governs={one.name === governedBy} />
            ))}
          </table>
        )}
        <dl className="ledger-list">
          <LedgerRow
            label={bent ? 'Bending strength needed' : 'Strength needed'}
            note={governedBy === null ? undefined : `by ${governedBy}`}
          >
            <Figure value={strengthRequiredKn} unit="kN" decimals={1} round="up" why="a case has no figure" />
          </LedgerRow>
          <LedgerRow label="Class needed" note={coupling === null ? undefined : `coupling ${coupling}`}>
            <Figure
              value={classRequiredKn}
              unit="kN"
              name="mechanical.class"
              label="Class needed"
              why={
                strengthRequiredKn === null
                  ? undefined
                  : lowerFirst(whyNot(evaluation, 'mechanical.class') ?? 'above the last class')
              }
            />
          </LedgerRow>
        </dl>
      </TraceArea>
    </LedgerBlock>
  );
}

const kilo = (valueN: number | null): number | null => (valueN === null ? null : valueN / 1000);

function CaseRows({ result, index, governs }: { result: MechanicalCaseResult; index: number; governs: boolean }) {
  const { name, kind, verticalN, horizontalN, loadPerStringN, loadOneStringMissingN, legs, post, slackLeg, verdict } =
    result;
  return (
    <tbody className={governs ? 'is-governing' : undefined}>
      <tr>
        <th scope="row">
          {name}
          {governs && <small className="governs-word"> governs</small>}
          {kind && <small>{CHOICE_LABELS.loadCaseKind[kind].toLowerCase()}</small>}
        </th>
        <td>
          <Figure
            value={kilo(loadPerStringN)}
            unit="kN"
            decimals={1}
            round="up"
            name={caseName(index)}
            label={`${name}, load per string`}
          />
        </td>
        <td>
          <Figure value={result.factorRequired} decimals={2} round="up" />
        </td>
        <td>
          <Figure value={result.factorProvided} decimals={2} round="down" />
          {verdict !== 'unknown' && (
            <span className={`verdict is-${verdict}`}>
              {' '}
              {verdict === 'short' ? '✕ ' : '✓ '}
              {CHOICE_LABELS.verdict[verdict].toLowerCase()}
            </span>
          )}
        </td>
      </tr>
      <tr className="row-source">
        <td colSpan={4}>
          <small>
            vertical <Figure value={kilo(verticalN)} unit="kN" decimals={1} />, horizontal{' '}
            <Figure value={kilo(horizontalN)} unit="kN" decimals={1} />
            {loadOneStringMissingN !== null && (
              <>
                , one {post ? 'post' : 'string'} missing{' '}
                <Figure value={kilo(loadOneStringMissingN)} unit="kN" decimals={1} round="up" />
              </>
            )}
            {legs && (
              <>
                , windward leg <Figure value={kilo(legs.windwardN)} unit="kN" decimals={1} round="up" />, leeward leg{' '}
                {slackLeg ? 'slack' : <Figure value={kilo(legs.leewardN)} unit="kN" decimals={1} round="up" />}
              </>
            )}
            {post && (
              <>
                , along the post <Figure value={kilo(post.alongN)} unit="kN" decimals={1} round="up" />
              </>
            )}
          </small>
        </td>
      </tr>
    </tbody>
  );
}
