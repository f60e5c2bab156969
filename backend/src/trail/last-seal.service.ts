import { Injectable } from '@nestjs/common';
import type { Knex } from 'knex';
import type { LastSeal } from '@bellgap/common/api';
import { SealsRepository, type Seal } from './seals.repository';

/** Digits of a hash that are printed and mailed. */
export const PRINTED_HASH_DIGITS = 12;

/** The end of the chain as it is printed on sheets and mailed, so that a tail that was cut off shows. */
@Injectable()
export class LastSealService {
  constructor(private readonly seals: SealsRepository) {}

  async lastSeal(db?: Knex): Promise<LastSeal | null> {
    const seal = await this.seals.last(db);
    return seal ? printedSeal(seal) : null;
  }
}

export function printedSeal({ number, hash, sealed_at }: Seal): LastSeal {
  return { number, hash: hash.slice(0, PRINTED_HASH_DIGITS), at: sealed_at.toISOString() };
}
