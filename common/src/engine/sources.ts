import type { SourceReference, Status } from './model';

/** A document in one edition. Each stands here once and is cited by clause. */
export interface SourceDocument {
  document: string;
  edition: string;
}

export const IEC_60071_1 = { document: 'IEC 60071-1', edition: '2006, with amendment 1:2010' } as const;
export const IEC_60071_2 = { document: 'IEC 60071-2', edition: '1996' } as const;
export const IEC_62271_1 = { document: 'IEC 62271-1', edition: '2011' } as const;
export const IEC_60060_1 = { document: 'IEC 60060-1', edition: '2010' } as const;
export const IEC_TS_60815_1 = { document: 'IEC TS 60815-1', edition: '2008' } as const;
export const IEC_TS_60815_2 = { document: 'IEC TS 60815-2', edition: '2008' } as const;
export const IEC_TS_60815_3 = { document: 'IEC TS 60815-3', edition: '2008' } as const;
export const IEC_60815 = { document: 'IEC 60815', edition: '1986' } as const;
export const IEC_60305 = { document: 'IEC 60305', edition: '1995' } as const;
export const IEC_60433 = { document: 'IEC 60433', edition: '1998' } as const;
export const IEC_61466_1 = { document: 'IEC 61466-1', edition: '1997' } as const;
export const IEC_60383_1 = { document: 'IEC 60383-1', edition: '1993' } as const;
export const IEC_61936_1 = { document: 'IEC 61936-1', edition: '2010' } as const;
export const ISO_2533 = { document: 'ISO 2533', edition: '1975' } as const;
export const EN_50341_1 = { document: 'EN 50341-1', edition: '2001' } as const;
export const RD_223_2008 = { document: 'RD 223/2008, ITC-LAT 07', edition: '2008' } as const;
export const RD_337_2014_RAT_12 = { document: 'RD 337/2014, ITC-RAT 12', edition: '2014' } as const;
export const RD_337_2014_RAT_15 = { document: 'RD 337/2014, ITC-RAT 15', edition: '2014' } as const;
export const SWISS_LEV = { document: 'Swiss ordinance on electric lines (LeV)', edition: '1994' } as const;
export const RUS_1724E_200 = { document: 'RUS Bulletin 1724E-200', edition: '2009' } as const;
export const RUS_1724E_300 = { document: 'RUS Bulletin 1724E-300', edition: '2001' } as const;
export const ANSI_C37_30 = { document: 'ANSI/IEEE C37.30', edition: '1997' } as const;
export const ANSI_C37_32 = { document: 'ANSI C37.32', edition: '1996' } as const;
export const NESC_1997 = { document: 'NESC (IEEE C2)', edition: '1997' } as const;
export const ANSI_C29_2 = { document: 'ANSI C29.2', edition: '1992' } as const;
export const GB_T_16434 = { document: 'GB/T 16434', edition: '1996' } as const;
/** Capacitance network of a string of discs as textbooks of power systems have it. */
export const TEXTBOOK_NETWORK = { document: 'Textbooks of power systems', edition: '' } as const;
/** Switching-surge flashover rate of lines and its estimate by a step, as handbooks of insulation co-ordination have it. */
export const SWITCHING_SURGE_RATE = { document: 'Handbooks of insulation co-ordination', edition: '' } as const;
/** Definitions and plain arithmetic on figures that carry their own sources. */
export const DEFINITION = { document: 'Definition', edition: '' } as const;
/** Common practice without a published source. */
export const PRACTICE = { document: 'Common practice', edition: '' } as const;
/** What the company's administrator has set. */
export const COMPANY = { document: 'Company settings', edition: '' } as const;

/** A citation as it is printed. */
export function cite(source: SourceDocument, clause: string, status: Status): SourceReference {
  return { document: source.document, edition: source.edition, clause, status };
}
