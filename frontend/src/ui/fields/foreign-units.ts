interface KnownUnit {
  dimension: 'length' | 'force' | 'voltage' | 'current' | 'time' | 'pressure';
  /** How it is written in a message. */
  shown: string;
  /** One of it in the dimension's base unit (m, N, V, A, s, Pa). */
  inBase: number;
}

/** Units that people type behind a figure, in lower case. Inch, foot and pound-force are exact by definition. */
const UNITS: Record<string, KnownUnit> = {
  mm: { dimension: 'length', shown: 'mm', inBase: 0.001 },
  cm: { dimension: 'length', shown: 'cm', inBase: 0.01 },
  m: { dimension: 'length', shown: 'm', inBase: 1 },
  km: { dimension: 'length', shown: 'km', inBase: 1000 },
  in: { dimension: 'length', shown: 'in', inBase: 0.0254 },
  inch: { dimension: 'length', shown: 'in', inBase: 0.0254 },
  inches: { dimension: 'length', shown: 'in', inBase: 0.0254 },
  '"': { dimension: 'length', shown: 'in', inBase: 0.0254 },
  '″': { dimension: 'length', shown: 'in', inBase: 0.0254 },
  ft: { dimension: 'length', shown: 'ft', inBase: 0.3048 },
  foot: { dimension: 'length', shown: 'ft', inBase: 0.3048 },
  feet: { dimension: 'length', shown: 'ft', inBase: 0.3048 },
  "'": { dimension: 'length', shown: 'ft', inBase: 0.3048 },
  '′': { dimension: 'length', shown: 'ft', inBase: 0.3048 },
  n: { dimension: 'force', shown: 'N', inBase: 1 },
  kn: { dimension: 'force', shown: 'kN', inBase: 1000 },
  lbf: { dimension: 'force', shown: 'lbf', inBase: 4.4482216152605 },
  lb: { dimension: 'force', shown: 'lbf', inBase: 4.4482216152605 },
  kip: { dimension: 'force', shown: 'kip', inBase: 4448.2216152605 },
  v: { dimension: 'voltage', shown: 'V', inBase: 1 },
  kv: { dimension: 'voltage', shown: 'kV', inBase: 1000 },
  'kv rms': { dimension: 'voltage', shown: 'kV', inBase: 1000 },
  'kv peak': { dimension: 'voltage', shown: 'kV', inBase: 1000 },
  mv: { dimension: 'voltage', shown: 'MV', inBase: 1e6 },
  a: { dimension: 'current', shown: 'A', inBase: 1 },
  ka: { dimension: 'current', shown: 'kA', inBase: 1000 },
  s: { dimension: 'time', shown: 's', inBase: 1 },
  ms: { dimension: 'time', shown: 'ms', inBase: 0.001 },
  pa: { dimension: 'pressure', shown: 'Pa', inBase: 1 },
  kpa: { dimension: 'pressure', shown: 'kPa', inBase: 1000 },
  psf: { dimension: 'pressure', shown: 'psf', inBase: 47.88025898033584 },
};

export type UnitReading =
  | { kind: 'same' }
  | { kind: 'convertible'; factor: number; shown: string }
  | { kind: 'foreign-kind'; shown: string }
  | { kind: 'unknown' };

function lookUp(text: string): KnownUnit | undefined {
  return UNITS[text.trim().replace(/\.$/, '').replace(/\s+/g, ' ').toLowerCase()];
}

/** What a unit typed behind a figure means in a field of the given unit. */
export function readUnit(typed: string, unit: string | undefined): UnitReading {
  if (unit !== undefined && typed.trim().toLowerCase() === unit.toLowerCase()) return { kind: 'same' };
  const given = lookUp(typed);
  if (!given) return { kind: 'unknown' };
  const own = unit === undefined ? undefined : lookUp(unit);
  if (!own || own.dimension !== given.dimension) return { kind: 'foreign-kind', shown: given.shown };
  // "kV peak" typed where the field counts r.m.s. is another quantity, not another unit.
  const saysPeak = /peak/i.test(typed);
  const saysRms = /rms/i.test(typed);
  if ((saysPeak && !/peak/.test(unit ?? '')) || (saysRms && !/rms/.test(unit ?? ''))) {
    return { kind: 'foreign-kind', shown: typed.trim() };
  }
  if (own.inBase === given.inBase) return { kind: 'same' };
  return { kind: 'convertible', factor: given.inBase / own.inBase, shown: given.shown };
}
