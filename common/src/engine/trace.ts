import type { Caution, Severity, SourceReference, Status, TableConfirmation, TraceLine } from './model';
import { unitOf } from './quantities';
import { rowKeyOf, type StandardTable, type TableRow } from './standards/table';

type Figures = Record<string, number>;

export interface FormulaDefinition<A extends Figures> {
  /** Stable id, "topic.name"; also the key under which an owner of the print confirms it. */
  id: string;
  heading: string;
  source: SourceReference;
  /** What the reader sees: "L = n * P". */
  expression: string;
  /** Symbols of the right-hand side and the figures they stand for. */
  symbols: Record<string, keyof A & string>;
  /** Name of the result; its ending gives the unit. */
  result: string;
  /** Where the formula holds, boundaries included. */
  range?: { [K in keyof A]?: readonly [least: number, most: number] };
  compute: (figures: A) => number;
}

/** A figure that lies outside where a formula holds. */
export interface OutsideRange {
  name: string;
  value: number;
  least: number;
  most: number;
}

/** A published formula: called, it gives the figure; it can also show itself and name its limits. */
export interface Formula<A extends Figures> {
  (figures: A): number;
  readonly definition: FormulaDefinition<A>;
  outside(figures: Partial<A>): OutsideRange | null;
  line(figures: A, value: number): TraceLine;
}

/** Figures in a substitution: seven digits, no locale. */
export function figureText(value: number): string {
  const text = String(Number(value.toPrecision(7)));
  return value < 0 ? `(${text})` : text;
}

function substitute<A extends Figures>({ expression, symbols }: FormulaDefinition<A>, figures: A): string {
  const [left, ...right] = expression.split(' = ');
  const shown = right.join(' = ').replace(/[A-Za-zΔα-ω_][A-Za-z0-9_'Δα-ω]*/g, (word) => {
    const name = symbols[word];
    return name === undefined ? word : figureText(figures[name] as number);
  });
  return `${left} = ${shown}`;
}

/**
 * Makes a formula out of what is shown and what is run. The substitution is made from the expression, the unit from the
 * ending of the result's name; a test evaluates every expression and compares it with `compute`.
 */
export function formula<A extends Figures>(definition: FormulaDefinition<A>): Formula<A> {
  const run = (figures: A): number => definition.compute(figures);
  return Object.assign(run, {
    definition,
    outside(figures: Partial<A>): OutsideRange | null {
      for (const [name, limits] of Object.entries(definition.range ?? {})) {
        const value = figures[name];
        const [least, most] = limits as readonly [number, number];
        if (value !== undefined && (value < least || value > most)) return { name, value, least, most };
      }
      return null;
    },
    line(figures: A, value: number): TraceLine {
      return {
        id: definition.id,
        heading: definition.heading,
        formula: definition.expression,
        substitution: substitute(definition, figures),
        result: value,
        unit: unitOf(definition.result) ?? '',
        source: definition.source,
      };
    },
  });
}

export interface RunOptions {
  /** Which use of the formula this is, e.g. "lightning"; becomes part of the line's id. */
  as?: string;
  heading?: string;
  /** A better source than the formula's own, e.g. the one that fixes its exponent. */
  source?: SourceReference;
}

/**
 * One evaluation's working: runs formulas, keeps their lines where a trace is wanted, and gathers cautions, what was
 * not assessed, and how well the figures used are known. Without a trace a run costs the formula alone.
 */
export class Calculation {
  readonly lines: TraceLine[] = [];
  readonly cautions: Caution[] = [];
  readonly notAssessed: { part: string; why: string }[] = [];
  /** Disputed rows and formulas that were used, in order of use. */
  readonly disputed: string[] = [];
  restsOnMemory = false;
  /** By key; null where there are none, so that no keys need be made. */
  private readonly confirmations: ReadonlyMap<string, TableConfirmation['outcome']> | null;

  constructor(
    readonly tracing: boolean,
    confirmations: readonly TableConfirmation[] = [],
  ) {
    this.confirmations =
      confirmations.length === 0 ? null : new Map(confirmations.map(({ key, outcome }) => [key, outcome]));
  }

  /** Status of a figure after what owners of the print have recorded; noted as used. */
  status(key: string, known: Status): Status {
    const status = this.confirmations?.get(key) ?? known;
    if (status === 'memory') this.restsOnMemory = true;
    if (status === 'disputed' && !this.disputed.includes(key)) this.disputed.push(key);
    return status;
  }

  /** Runs a formula and, where a trace is wanted, keeps its line. */
  run<A extends Figures>(of: Formula<A>, figures: A, { as, heading, source }: RunOptions = {}): number {
    const value = of(figures);
    const cited = source ?? of.definition.source;
    const status = this.status(of.definition.id, cited.status);
    if (this.tracing) {
      const line = of.line(figures, value);
      this.lines.push({
        ...line,
        id: as === undefined ? line.id : `${line.id}:${as}`,
        heading: heading ?? line.heading,
        source: { ...cited, status },
      });
    }
    return value;
  }

  /** Status of one row as it stands now, without noting that the answer rests on it. */
  statusOf<Row extends object>(table: StandardTable<Row>, row: TableRow<Row>): Status {
    return this.confirmations?.get(`${table.key}:${rowKeyOf(table, row)}`) ?? row.status;
  }

  /**
   * Citation of one row of a table, with the status the row has now. A row may know some of its columns less well than
   * others; `known` then says how well those are known that were used.
   */
  row<Row extends object>(table: StandardTable<Row>, row: TableRow<Row>, known: Status = row.status): SourceReference {
    const key = this.confirmations || known === 'disputed' ? `${table.key}:${rowKeyOf(table, row)}` : '';
    const { document, edition, clause } = table;
    return { document, edition, clause, status: this.status(key, known) };
  }

  /** Keeps a line that is no formula: a row that was read or a choice that was made. Built only where it is wanted. */
  note(line: () => TraceLine): void {
    if (this.tracing) this.lines.push(line());
  }

  caution(code: string, severity: Severity, text: string, field: string | null = null): void {
    this.cautions.push({ code, severity, text, field });
  }

  missing(part: string, why: string): void {
    this.notAssessed.push({ part, why });
  }
}
