import { unitOf } from './quantities';

/** Names whose words do not follow from their spelling. */
const LABELS: Record<string, string> = {
  ansiClass: 'ANSI class',
  bilKv: 'BIL',
  couplingIec60120: 'Coupling, IEC 60120',
  d50HzPhaseToEarthM: 'D50Hz to earth',
  d50HzPhaseToPhaseM: 'D50Hz between phases',
  delM: 'Del',
  dppM: 'Dpp',
  esddMaximumMgPerCm2: 'ESDD, most (mg/cm²)',
  esddMinimumMgPerCm2: 'ESDD, least (mg/cm²)',
  level1986: 'Level of 1986',
  nescAdderIn: 'NESC adder',
  nescIn: 'NESC',
  nescRoundedUpIn: 'NESC, rounded up',
  scd1986MmPerKvUm: 'Specific creepage of 1986, on Um',
  statusD50Hz: 'Status of D50Hz',
  statusNesc: 'Status of NESC',
  strengthLb: 'Strength (lb)',
  upTo200KvFactor: 'Gaps up to 200 kV',
  upTo400KvFactor: 'Gaps up to 400 kV',
  upTo700KvFactor: 'Gaps up to 700 kV',
  upTo1100KvFactor: 'Gaps up to 1100 kV',
  above1100KvFactor: 'Gaps above 1100 kV',
  uscdMmPerKv: 'Unified specific creepage',
};

/** Endings that are a unit and no word; those without a unit, such as "Factor", stay. */
function withoutUnit(name: string): string {
  const unit = unitOf(name);
  if (unit === null || unit === '' || unit === 'units') return name;
  const ending =
    /(MmPerKvUm|MmPerKv|InPerKvLineToGround|InPerKv|KgPerM3|KvPerM|NPerM|MPerS|KvPeak|PeakKv|KvRms|RmsKv)$/;
  const left = ending.test(name) ? name.replace(ending, '') : name.replace(/[A-Z][a-z]*$/, '');
  return left === '' ? name : left;
}

/** The words of a name without its unit: "highestVoltageKv" is "Highest voltage". */
export function labelOfName(name: string): string {
  const known = LABELS[name];
  if (known !== undefined) return known;
  const words = name.startsWith('status') && name !== 'status' ? `statusOf${name.slice(6)}` : withoutUnit(name);
  const text = words
    .replace(/([a-z0-9])([A-Z])/g, '$1 $2')
    .replace(/([a-z]{2})(\d{3,})/g, '$1 $2')
    .toLowerCase()
    .replace(/(\d+) kv\b/g, '$1 kV');
  return text.charAt(0).toUpperCase() + text.slice(1);
}
