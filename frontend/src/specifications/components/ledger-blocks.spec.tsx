import { render, screen, within } from '@testing-library/react';
import { anEvaluation } from '../testing/fake-server';
import { BridgeBlock } from './bridge-block';
import { ClearanceBlocks } from './clearance-blocks';
import { CriteriaBlock } from './criteria-block';
import { LengthsBlock } from './lengths-block';
import { MechanicalBlock } from './mechanical-block';
import { SafetyBlock } from './safety-block';
import { VoltageBlock } from './voltage-block';

const ruleOfThumb = (given: Partial<ReturnType<typeof anEvaluation>['ruleOfThumb']>) => ({
  ruleOfThumb: { rows: [], bridge: null, bridgeWhyNot: null, ...given },
});

describe('the titles of the ledger', () => {
  it.each([
    ['line-post', 'Post by criterion', 'The post'],
    ['composite-rod', 'Rod by criterion', 'The string'],
    ['cap-and-pin', 'Units by criterion', 'The string'],
  ] as const)('name what is chosen: %s', (kind, criteria, lengths) => {
    render(
      <>
        <CriteriaBlock evaluation={anEvaluation(1)} kind={kind} />
        <LengthsBlock evaluation={anEvaluation(1)} kind={kind} />
      </>,
    );
    const names = screen.getAllByRole('heading').map((item) => item.textContent?.trim());
    expect(names).toEqual([criteria, lengths]);
  });
});

describe('from the rule to the count', () => {
  const bridge = [
    { cause: 'rule-to-method', units: -1 },
    { cause: 'pollution', units: 7 },
    { cause: 'altitude', units: 0 },
    { cause: 'unit', units: -4 },
  ] as const;

  it('is a table whose steps add up from the rule to what is specified', () => {
    render(<BridgeBlock evaluation={anEvaluation(17, ruleOfThumb({ bridge: [...bridge] }))} />);
    const rows = screen.getAllByRole('row').map((row) => row.textContent);
    expect(rows.slice(1)).toEqual([
      'Rule1515',
      'Rule to method−114',
      'Pollution+721',
      'Altitude021',
      'Unit−417',
      'Specified1717',
    ]);
  });

  it('says why there is none, and stands back where there is nothing to say', () => {
    const { rerender, container } = render(
      <BridgeBlock evaluation={anEvaluation(1, ruleOfThumb({ bridgeWhyNot: 'The string is a rod.' }))} />,
    );
    expect(screen.getByText('no bridge: the string is a rod.')).toBeInTheDocument();
    rerender(<BridgeBlock evaluation={anEvaluation(17, ruleOfThumb({}))} />);
    expect(container).toBeEmptyDOMElement();
  });
});

describe('voltage along the string', () => {
  it('names the line end, the efficiency and what they concern', () => {
    render(<VoltageBlock evaluation={anEvaluation(17)} />);
    const [lineEnd] = anEvaluation(17).string!.voltageSharing;
    const row = screen.getByText('Across the unit at the line end').closest('div')!;
    expect(within(row).getByText((Math.ceil(lineEnd! * 10) / 10).toFixed(1))).toBeInTheDocument();
    expect(screen.getByText('Concerns corona, radio noise and ageing, never the count.')).toBeInTheDocument();
  });

  it('says what it rests on, figure by figure', () => {
    const { string } = anEvaluation(17);
    const sharing = {
      pinToEarth: { valueRatio: 0.1, from: 'usual' as const },
      pinToLine: { valueRatio: 0.025, from: 'entered' as const },
    };
    render(<VoltageBlock evaluation={anEvaluation(17, { string: { ...string!, sharing } })} />);
    expect(
      screen.getByText(
        'Over the self capacitance of a unit: c = 0.1 to earth (usual, practice), k = 0.025 to the line (entered).',
      ),
    ).toBeInTheDocument();
  });

  it('says why it was not assessed', () => {
    const { string } = anEvaluation(17);
    const evaluation = anEvaluation(17, {
      string: string && { ...string, voltageSharing: [], efficiencyPercent: null },
      notAssessed: [{ part: 'string.voltageSharing', why: 'The network describes cap and pin units.' }],
    });
    render(<VoltageBlock evaluation={evaluation} />);
    expect(screen.getByText(/not assessed: the network describes/)).toBeInTheDocument();
  });
});

describe('mechanical loads', () => {
  const loads = {
    name: 'Wind',
    kind: 'wind' as const,
    verticalN: 15232,
    horizontalN: 13740,
    loadPerStringN: 20513,
    loadOneStringMissingN: 41026,
    factorRequired: 3.75,
    factorProvided: 3.1,
    slackLeg: false,
    verdict: 'short' as const,
  };

  it('stand by case with factor, verdict and the class they need', () => {
    const mechanical = {
      cases: [loads],
      governedBy: 'Wind',
      strengthRequiredKn: 76.92,
      classRequiredKn: 80,
      coupling: '16',
    };
    render(<MechanicalBlock evaluation={anEvaluation(17, { mechanical })} />);
    const row = screen.getByRole('row', { name: /Wind/ });
    expect(row).toHaveTextContent('Wind governswind20.6 kN3.753.10 ✕ short');
    expect(screen.getByText(/one string missing/)).toHaveTextContent('41.1 kN');
    expect(screen.getByText('coupling 16').closest('div')).toHaveTextContent('80 kN');
  });

  it('are not there where none are filled in', () => {
    const { container } = render(<MechanicalBlock evaluation={anEvaluation(17)} />);
    expect(container).toBeEmptyDOMElement();
  });
});

describe('distances for people', () => {
  const row = {
    method: 'iec-table' as const,
    distance: 'safety' as const,
    stress: 'height-over-access',
    shape: null,
    withstandKv: null,
    altitudeFactor: 1.014,
    h0M: 1000,
    exponent: null,
    valueMm: 4600,
    interpolated: false,
    withinSource: true,
    governs: false,
    source: { document: 'IEC 61936-1', edition: '2010', clause: 'safety distances', status: 'memory' as const },
  };

  it('stand in their own block with their source and what has to be accepted', () => {
    const { clearances } = anEvaluation(17);
    const caution = {
      code: 'safety-source-from-memory',
      severity: 'acceptance' as const,
      text: 'The distances of IEC 61936-1 are from memory.',
      field: 'clearance.safetySource',
    };
    const evaluation = anEvaluation(17, {
      clearances: clearances && { ...clearances, rows: [...clearances.rows, row] },
      cautions: [caution],
    });
    render(<SafetyBlock evaluation={evaluation} />);
    expect(screen.getByText(/IEC 61936-1:2010, safety distances/)).toBeInTheDocument();
    expect(screen.getByText(caution.text)).toBeInTheDocument();
    expect(screen.getByRole('row', { name: /Height over access areas/ })).toHaveTextContent('1.0144,600 mm');
  });

  it('say that they are not covered where no source is chosen', () => {
    render(<SafetyBlock evaluation={anEvaluation(17)} />);
    expect(screen.getByText(/not covered by this sheet: the local rule/)).toBeInTheDocument();
  });
});

describe('rows of the other clearance methods', () => {
  it('say why a method has no figure, each in the block of its distance', () => {
    const { clearances } = anEvaluation(17);
    const besideWhyNot = [
      { method: 'en-theoretical', distance: 'phase-to-earth', why: 'The kind of gap is not chosen.' },
      { method: 'north-american', distance: 'phase-to-phase', why: 'The lightning level is not known.' },
    ] as const;
    const evaluation = anEvaluation(17, { clearances: { ...clearances!, besideWhyNot: [...besideWhyNot] } });
    const { rerender } = render(<ClearanceBlocks evaluation={evaluation} />);
    const notes = screen.getAllByText(/no figure beside/).map(({ textContent }) => textContent);
    expect(notes).toEqual([
      'EN 50341 theoretical, no figure beside: the kind of gap is not chosen. “Kind of gap” and “Fast-front voltage from” are asked only with that method.',
      'North American, no figure beside: the lightning level is not known.',
    ]);
    rerender(<ClearanceBlocks evaluation={anEvaluation(17, { clearances: { ...clearances!, besideWhyNot: [] } })} />);
    expect(screen.queryByText(/no figure beside/)).not.toBeInTheDocument();
  });
});
