import type { Knex } from 'knex';
import { NAMED_AT_MOST, type TrailVerification } from '@bellgap/common/api';
import type { Clock } from '../platform/clock';
import { printedSeal } from './last-seal.service';
import { NO_SEAL_BEFORE, sealHash, sealedColumns, type SealedRow } from './sealed-row';
import type { Seal } from './seals.repository';

type Findings = TrailVerification['broken'];
type Finding = Findings['named'][number];
type ChainRow = { number: number; sealed_event_id: number; hash: string } & (
  SealedRow | { [Column in keyof SealedRow]: null }
);

/** The seal that a print or a mail shows. */
export interface KnownSeal {
  number: number;
  /** The first digits of its hash. */
  hash: string;
}

const BATCH_ROWS = 1000;
/** A row is sealed within seconds; one that is older than this without a seal was put in or cut off. */
const SEALED_WITHIN_MS = 60_000;

/** Goes through the whole chain in batches and names what was changed, what is gone and what was never sealed. */
export class TrailVerifier {
  constructor(
    private readonly knex: Knex,
    private readonly clock: Clock,
  ) {}

  async verify(known: KnownSeal | null = null, progress: (checkedCount: number) => void = () => undefined) {
    const last = await this.knex('audit_seals').orderBy('number', 'desc').first<Seal | undefined>();
    const broken = noFindings();
    const missing = noFindings();
    let checkedCount = 0;
    let before = { number: 0, hash: NO_SEAL_BEFORE };
    for await (const row of this.chain(last?.number ?? 0)) {
      const follows = row.number === before.number + 1;
      for (let number = before.number + 1; number < row.number; number += 1) add(missing, { number, eventId: null });
      if (row.event_id === null) add(missing, { number: row.number, eventId: row.sealed_event_id });
      // What stands after a number that is gone rests on a hash that nobody knows any more.
      else if (follows && sealHash(before.hash, row) !== row.hash) {
        add(broken, { number: row.number, eventId: row.event_id });
      }
      before = row;
      checkedCount += 1;
      if (checkedCount % BATCH_ROWS === 0) progress(checkedCount);
    }
    const unsealed = await this.unsealed();
    const knownSeal = known && (await this.compare(known));
    const sound = [broken, missing, unsealed].every(({ count }) => count === 0) && (knownSeal ?? 'agrees') === 'agrees';
    return {
      verifiedAt: this.clock.now().toISOString(),
      sound,
      checkedCount,
      lastSeal: last ? printedSeal(last) : null,
      broken,
      missing,
      unsealed,
      knownSeal,
    } satisfies TrailVerification;
  }

  private async *chain(lastNumber: number): AsyncGenerator<ChainRow> {
    let pastNumber = 0;
    for (;;) {
      const rows = (await this.knex('audit_seals as s')
        .leftJoin('audit_events as e', 'e.id', 's.event_id')
        .where('s.number', '>', pastNumber)
        .where('s.number', '<=', lastNumber)
        .orderBy('s.number')
        .limit(BATCH_ROWS)
        .select('s.number', 's.event_id as sealed_event_id', 's.hash', ...sealedColumns(this.knex))) as ChainRow[];
      yield* rows;
      if (rows.length < BATCH_ROWS) return;
      pastNumber = rows.at(-1)!.number;
    }
  }

  private async unsealed(): Promise<Findings> {
    const before = new Date(this.clock.now().getTime() - SEALED_WITHIN_MS);
    const query = this.knex('audit_events as e')
      .where('e.at', '<', before)
      .whereNotExists((seal) => seal.select(this.knex.raw('1')).from('audit_seals as s').whereRaw('s.event_id = e.id'));
    const counted = await query.clone().count<{ count: number }[]>({ count: '*' });
    const count = counted[0]?.count ?? 0;
    if (count === 0) return noFindings();
    const ids = (await query.clone().orderBy('e.id').limit(NAMED_AT_MOST).pluck('e.id')) as number[];
    return { count, named: ids.map((eventId) => ({ number: null, eventId })) };
  }

  private async compare({ number, hash }: KnownSeal): Promise<TrailVerification['knownSeal']> {
    const seal = await this.knex('audit_seals').where({ number }).first<Seal | undefined>();
    if (!seal) return 'gone';
    return seal.hash.startsWith(hash) ? 'agrees' : 'differs';
  }
}

const noFindings = (): Findings => ({ count: 0, named: [] });

function add(findings: Findings, finding: Finding): void {
  findings.count += 1;
  if (findings.named.length < NAMED_AT_MOST) findings.named.push(finding);
}
