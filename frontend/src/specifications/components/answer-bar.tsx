import type { Criterion, Evaluation, InsulatorUnit, SpecificationInput } from '@bellgap/common/api';
import { memo } from 'react';
import { Figure, formatNumber } from '../../ui/figure';
import { TraceArea } from '../../ui/trace';
import type { Answer, AnswerState } from '../hooks/use-live-evaluation';
import { criterionWords, governingWords, missingWords, stringWords, whyNot } from '../model/words';
import { Gravest, Spoken } from './answer-parts';

interface Properties {
  answer: Answer;
  state: AnswerState;
  message: string | null;
  unit: InsulatorUnit | null;
}

const STATE_WORDS: Record<Exclude<AnswerState, 'current'>, string> = {
  waiting: 'working it out…',
  faulty: 'answer from before: a field cannot be read yet',
  unreachable: 'answer from before: no connection, trying again',
  'signed-out': 'answer from before: signed out',
  failed: 'answer from before',
};

/** The answer on top, in words and figures: how many of what, how much creepage, how long, and what governs. */
export const AnswerBar = memo(function AnswerBar({ answer, state, message, unit }: Properties) {
  const { evaluation, input } = answer;
  const sentence = sentenceOf(answer, unit);
  return (
    <div className={`answer is-${state}`} data-testid="answer" data-state={state}>
      <TraceArea className="answer-figures">
        <Count evaluation={evaluation} input={input} unit={unit} />
        <Creepage evaluation={evaluation} />
        <Length evaluation={evaluation} input={input} />
        {input.kind === 'bay' && <BayDistances evaluation={evaluation} />}
        <Governing evaluation={evaluation} unit={unit} />
      </TraceArea>
      {state !== 'current' && (
        <p className="answer-state">
          <span className="answer-state-mark" aria-hidden="true" />
          {STATE_WORDS[state]}
          {state === 'failed' && message && `: ${message}`}
        </p>
      )}
      <Spoken sentence={sentence} isCurrent={state === 'current'} />
      <div className="answer-pinned" aria-hidden="true">
        <b>{shortCount(evaluation, unit)}</b>
        <span>{shortGoverning(evaluation)}</span>
        <Gravest cautions={evaluation.cautions} />
      </div>
    </div>
  );
});

const isStopped = ({ cautions }: Evaluation): boolean => cautions.some(({ severity }) => severity === 'stop');

function noCountWhy(evaluation: Evaluation, input: SpecificationInput): string {
  const stop = evaluation.cautions.find(({ severity }) => severity === 'stop');
  return stop?.text ?? missingWords(input) ?? whyNot(evaluation, 'string') ?? 'No criterion could be assessed';
}

/** What is counted, in words: units of discs, rods or posts. */
function unitsWord(units: number, unit: InsulatorUnit | null): string {
  const one = unit?.kind === 'line-post' ? 'post' : isRod(unit) ? 'rod' : 'unit';
  return units === 1 ? one : `${one}s`;
}
const isRod = (unit: InsulatorUnit | null): boolean => unit !== null && unit.kind !== 'cap-and-pin';

function Count({
  evaluation,
  input,
  unit,
}: {
  evaluation: Evaluation;
  input: SpecificationInput;
  unit: InsulatorUnit | null;
}) {
  const units = evaluation.string?.units ?? null;
  if (input.kind === 'bay') {
    return (
      <div className="answer-main">
        <span className="answer-big">Substation bay</span>
        <small>clearances by stress, shape and altitude</small>
      </div>
    );
  }
  if (units === null) {
    return (
      <div className="answer-main">
        <span className="answer-big">{isStopped(evaluation) ? 'No count' : 'No count yet'}</span>
        <small className="answer-why">{noCountWhy(evaluation, input)}</small>
        <Gravest cautions={evaluation.cautions} />
      </div>
    );
  }
  return (
    <div className="answer-main">
      <span className="answer-big">
        <Figure value={units} name="string.units" label="Number of units" /> {unitsWord(units, unit)}
        {unit && ` ${unit.code}`}
      </span>
      {unit && <small>{stringWords(input, unit)}</small>}
    </div>
  );
}

function Creepage({ evaluation }: { evaluation: Evaluation }) {
  const { string } = evaluation;
  if (!string || (string.creepageProvidedMm === null && string.creepageRequiredMm === null)) return null;
  const basis = string.creepageVoltageBasis === 'line-to-line' ? 'line to line' : 'phase to earth';
  const words: string[] = [];
  if (string.creepageRequiredMm === null) words.push('needed: not known');
  else words.push(`needed ${formatNumber(string.creepageRequiredMm, { round: 'up' })} mm`);
  if (string.creepageVoltageKv !== null && string.uscdRequiredMmPerKv !== null) {
    const perKv = formatNumber(string.uscdRequiredMmPerKv, { decimals: 1, round: 'up' });
    words.push(`${perKv} mm/kV on ${formatNumber(string.creepageVoltageKv, { decimals: 1 })} kV ${basis}`);
  }
  if (string.scd1986RequiredMmPerKvUm !== null) {
    words.push(`${formatNumber(string.scd1986RequiredMmPerKvUm, { decimals: 1, round: 'up' })} mm/kV line to line`);
  }
  return (
    <div>
      <span className="answer-figure">
        <Figure value={string.creepageProvidedMm} round="down" name="string.creepageProvidedMm" label="Creepage" /> mm
        creepage
      </span>
      <small>{words.join(' · ')}</small>
    </div>
  );
}

const DEVICE_WORDS = { none: ', no devices', horns: ', with horns', rings: ', with rings' } as const;

function Length({ evaluation, input }: { evaluation: Evaluation; input: SpecificationInput }) {
  const { string } = evaluation;
  if (!string || string.sectionLengthMm === null) return null;
  const devices = input.string?.arcingDevices;
  const arc = string.dryArcWithDevicesMm ?? string.dryArcMm;
  return (
    <div>
      <span className="answer-figure">
        <Figure value={string.sectionLengthMm} round="down" name="string.sectionLengthMm" label="Section length" /> mm
        section length
      </span>
      <small>
        {arc === null ? 'dry arc not known' : `dry arc ${formatNumber(arc, { round: 'down' })} mm`}
        {devices ? DEVICE_WORDS[devices] : ''}
      </small>
    </div>
  );
}

function BayDistances({ evaluation: { clearances } }: { evaluation: Evaluation }) {
  return (
    <>
      <div>
        <span className="answer-figure">
          <Figure value={clearances?.phaseToEarthMm} round="up" /> mm to earth
        </span>
        <small>needed, metal to metal</small>
      </div>
      <div>
        <span className="answer-figure">
          <Figure value={clearances?.phaseToPhaseMm} round="up" /> mm between phases
        </span>
        <small>needed, metal to metal</small>
      </div>
    </>
  );
}

function marginOf({ string }: Evaluation, criterion: Criterion | null): number | null {
  return string?.criteria.find((one) => one.criterion === criterion)?.marginPercent ?? null;
}

function Governing({ evaluation, unit }: { evaluation: Evaluation; unit: InsulatorUnit | null }) {
  const { string } = evaluation;
  const words = string ? governingWords(string) : null;
  if (!string || words === null) return null;
  const margin = marginOf(evaluation, string.governedBy);
  const parts: string[] = [];
  if (margin !== null) parts.push(`margin ${formatNumber(margin, { decimals: 1, round: 'down' })} %`);
  for (const { criterion, requiredUnits } of string.criteria) {
    if (isRod(unit) || requiredUnits === null || criterion === string.governedBy || string.tiedWith.includes(criterion))
      continue;
    parts.push(`${criterionWords(criterion).toLowerCase()} needs ${requiredUnits}`);
  }
  const open = string.criteria
    .filter(({ state }) => state === 'not-assessed')
    .map(({ criterion }) => criterionWords(criterion).toLowerCase());
  if (open.length > 0) parts.push(`not assessed: ${open.join(', ')}`);
  return (
    <div>
      <span className="answer-governs">{words}</span>
      <small>{parts.join(' · ')}</small>
      <Gravest cautions={evaluation.cautions} />
    </div>
  );
}

function shortCount({ string, clearances }: Evaluation, unit: InsulatorUnit | null): string {
  if (string?.units !== null && string?.units !== undefined)
    return `${string.units} ${unitsWord(string.units, unit)}${unit ? ` ${unit.code}` : ''}`;
  if (!string && clearances?.phaseToEarthMm) return `${formatNumber(clearances.phaseToEarthMm)} mm to earth`;
  return 'No count yet';
}

function shortGoverning(evaluation: Evaluation): string {
  const words = evaluation.string ? governingWords(evaluation.string) : null;
  if (!words) return '';
  const margin = marginOf(evaluation, evaluation.string?.governedBy ?? null);
  return margin === null ? words : `${words}, ${formatNumber(margin, { decimals: 1, round: 'down' })} %`;
}

function sentenceOf({ evaluation, input }: Answer, unit: InsulatorUnit | null): string {
  const { string } = evaluation;
  if (string?.units === null || string?.units === undefined) return `No count: ${noCountWhy(evaluation, input)}`;
  const governing = governingWords(string);
  return `${shortCount(evaluation, unit)}.${governing ? ` ${governing}.` : ''}`;
}
