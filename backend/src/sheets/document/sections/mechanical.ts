import type { MechanicalCaseResult, MechanicalInput } from '@bellgap/common/api';
import { CHOICE_LABELS, fieldOf } from '@bellgap/common/schemas';
import { cell, figures, heading, type Block, type Pairs, type Row } from '../blocks';
import type { SheetContent } from '../content';
import { choice, down, inputWords, up, UNKNOWN, withUnit } from '../words';

const INPUTS = ['subconductors', 'windSpanM', 'weightSpanM', 'lineAngleDeg', 'fittingsStrengthKn'] as const;
/** Inputs that are printed only where they are filled in. */
const WHERE_GIVEN: ReadonlySet<string> = new Set(['iceRadialMm', 'iceDensityKgPerM3', 'fittingsStrengthKn']);
/** Inputs that only one basis asks for. */
const INPUTS_OF_RD_223 = ['crossing', 'acceptedStatistically'] as const;
const CASE_INPUTS = [
  'conductorWeightNPerM',
  'conductorDiameterMm',
  'iceRadialMm',
  'iceDensityKgPerM3',
  'windPressurePa',
  'conductorTensionN',
  'stringWindN',
  'stringWeightN',
  'hardwareWeightN',
] as const;

/** Loads by case, the strength they ask for, and the class and coupling that reach it. */
export function mechanical({ input, evaluation }: SheetContent): Block[] {
  const given = input.mechanical;
  const answer = evaluation.mechanical;
  if (!given || !answer) return [];
  const bent = answer.cases.some(({ post }) => post);
  return [
    heading(1, 'Mechanical loads'),
    { kind: 'pairs', labelShare: 0.45, rows: inputRows(given) },
    ...(answer.cases.length === 0
      ? []
      : [
          {
            kind: 'table' as const,
            summary: 'Loads of each case with the factor needed and provided',
            columns: [
              { head: 'case', share: 2.2 },
              { head: 'vertical', share: 1.2, align: 'right' as const },
              { head: 'horizontal', share: 1.2, align: 'right' as const },
              { head: bent ? 'a post, bending' : 'a string', share: 1.2, align: 'right' as const },
              { head: bent ? 'one post missing' : 'one string missing', share: 1.4, align: 'right' as const },
              { head: 'factor needed', share: 1, align: 'right' as const },
              { head: 'given', share: 0.9, align: 'right' as const },
              { head: 'verdict', share: 1 },
            ],
            rows: answer.cases.map((one) => caseRow(one, one.name === answer.governedBy)),
          },
        ]),
    {
      kind: 'pairs',
      labelShare: 0.45,
      rows: [
        {
          label: bent ? 'Bending strength needed' : 'Strength needed',
          value: withUnit(up(answer.strengthRequiredKn, 1), 'kN'),
        },
        {
          label: 'Class needed',
          value: withUnit(up(answer.classRequiredKn), 'kN'),
          ...(answer.coupling === null ? {} : { note: `coupling ${answer.coupling}` }),
          strong: true,
        },
      ],
    },
    ...(given.cases ?? []).flatMap((one, index): Block[] => [
      heading(2, `Case ${index + 1}: ${one.name ?? 'without a name'}`),
      {
        kind: 'pairs',
        labelShare: 0.45,
        rows: [
          ...CASE_INPUTS.filter((name) => isPrinted(name, one[name])).map((name) => {
            const path = `mechanical.cases.${name}`;
            return { label: fieldOf(path)?.label ?? name, value: inputWords(path, one[name]) };
          }),
          ...answer.cases.slice(index, index + 1).flatMap(partRows),
        ],
      },
    ]),
  ];
}

const isPrinted = (name: string, value: unknown): boolean =>
  !WHERE_GIVEN.has(name) || (value !== null && value !== undefined);

function inputRows(given: MechanicalInput): Pairs['rows'] {
  const names = given.basis === 'rd-223' ? [...INPUTS_OF_RD_223, ...INPUTS] : INPUTS;
  return [
    { label: 'Strength basis', value: choice(CHOICE_LABELS.mechanicalBasis, given.basis) },
    ...names
      .filter((name) => isPrinted(name, given[name]))
      .map((name) => {
        const path = `mechanical.${name}`;
        return { label: fieldOf(path)?.label ?? name, value: inputWords(path, given[name]) };
      }),
  ];
}

const kilo = (valueN: number | null): string => (valueN === null ? UNKNOWN : withUnit(up(valueN / 1000, 1), 'kN'));

/** Legs of a V and the load along a post, which have no column in the table. */
function partRows({ legs, post, slackLeg }: MechanicalCaseResult): Pairs['rows'] {
  if (post) return [{ label: 'Along the posts, pressing or pulling', value: kilo(post.alongN) }];
  if (!legs) return [];
  return [
    { label: 'Windward leg of the V', value: kilo(legs.windwardN) },
    { label: 'Leeward leg of the V', value: slackLeg ? 'slack' : kilo(legs.leewardN) },
  ];
}

function caseRow(one: MechanicalCaseResult, governs: boolean): Row {
  const kind = one.kind ? CHOICE_LABELS.loadCaseKind[one.kind].toLowerCase() : 'kind not stated';
  return {
    governs,
    cells: [
      cell(`${one.name}, ${kind}${governs ? ', governs' : ''}${one.slackLeg ? '; leeward leg slack' : ''}`),
      figures(kilo(one.verticalN)),
      figures(kilo(one.horizontalN)),
      figures(kilo(one.loadPerStringN)),
      figures(kilo(one.loadOneStringMissingN)),
      figures(up(one.factorRequired, 2)),
      figures(down(one.factorProvided, 2)),
      cell(CHOICE_LABELS.verdict[one.verdict].toLowerCase()),
    ],
  };
}
