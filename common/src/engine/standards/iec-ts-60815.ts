import type { PollutionClass, Status } from '../model';
import type { StandardTable } from './table';

/** Reference specific creepage of one pollution class, in both conventions. */
export interface UscdRow {
  /** Site pollution severity class. */
  pollutionClass: PollutionClass;
  className: string;
  /** Reference unified specific creepage, mm per kV r.m.s. of the voltage across the insulator (Um over root 3 on a sound system). */
  uscdMmPerKv: number;
  /** The same level in the convention of 1986, mm per kV of Um line to line. */
  scd1986MmPerKvUm: number;
  /** Level of the 1986 edition; null where it had none. */
  level1986: string | null;
}

const uscd = (
  pollutionClass: PollutionClass,
  className: string,
  uscdMmPerKv: number,
  scd1986MmPerKvUm: number,
  level1986: string | null,
  status: Status,
): UscdRow & { status: Status } => ({ pollutionClass, className, uscdMmPerKv, scd1986MmPerKvUm, level1986, status });

/** Creepage per kV: never show one column without its voltage. */
export const IEC_TS_60815_USCD: StandardTable<UscdRow> = {
  key: 'iec-ts-60815:uscd',
  title: 'Reference unified specific creepage distance by pollution class',
  document: 'IEC TS 60815-2 and -3',
  edition: '2008; IEC 60815:1986 beside it',
  clause: 'reference unified specific creepage distance; 1986 Table II',
  reproducedIn: 'RD 223/2008 ITC-LAT 07 Table 14 (1986 figures); extract of IEC 60433',
  rule: 'rows-as-printed',
  identifiedBy: ['pollutionClass'],
  remarks: [
    'Newer editions exist; their figures were not seen.',
    'The two columns state the same levels: one times root 3 is the other, rounded to 0.1. Mixing them up is an error of 73 %.',
  ],
  rows: [
    uscd('a', 'very light', 22, 12.7, null, 'memory'),
    uscd('b', 'light', 27.8, 16, 'I light', 'seen'),
    uscd('c', 'medium', 34.7, 20, 'II medium', 'seen'),
    uscd('d', 'heavy', 43.3, 25, 'III heavy', 'seen'),
    uscd('e', 'very heavy', 53.7, 31, 'IV very heavy', 'seen'),
  ],
};
