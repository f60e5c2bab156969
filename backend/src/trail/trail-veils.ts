import { Injectable } from '@nestjs/common';
import type { SignedIn } from '../platform/person';

/** The record of a row of the trail. */
export interface VeiledRecord {
  entity: string;
  entityId: string;
  /** The revision that the record belongs to, where it belongs to one. */
  revisionId: string | null;
}

/** Says whether the values of one field of one record stay hidden. */
export type Veil = (record: VeiledRecord, path: string) => boolean;
export type VeilMaker = (person: SignedIn, records: readonly VeiledRecord[]) => Promise<Veil>;

/**
 * Where a feature says which values of the trail a person may not see yet, such as the author's figures before the
 * checker's own. It is asked for each page once, and again for each batch of a file.
 */
@Injectable()
export class TrailVeils {
  private readonly makers: VeilMaker[] = [];

  add(maker: VeilMaker): void {
    this.makers.push(maker);
  }

  async over(person: SignedIn, records: readonly VeiledRecord[]): Promise<Veil> {
    const veils = await Promise.all(this.makers.map((maker) => maker(person, records)));
    return (record, path) => veils.some((veil) => veil(record, path));
  }
}
