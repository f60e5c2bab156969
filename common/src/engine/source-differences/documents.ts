/** Documents of other countries and practices: second opinions, on which no figure of a sheet rests. */
export const RPTD_05 = { document: 'RPTD No 05 (Chile)', edition: '2020' } as const;
export const RPTD_07 = { document: 'RPTD No 07 (Chile)', edition: '2020, amended 2022' } as const;
export const CEA_GUIDELINES = { document: 'CEA guidelines for substations (India)', edition: '' } as const;
export const INDIAN_RULES = { document: 'Indian Electricity Rules, as quoted', edition: '' } as const;
export const NEC = { document: 'NFPA 70', edition: '1999' } as const;
export const IEEE_1427 = { document: 'IEEE 1427, as quoted', edition: '' } as const;
export const NEMA_SG_6 = { document: 'NEMA SG 6', edition: '' } as const;
export const NELSON = { document: 'J. P. Nelson, IEEE Trans. Ind. Appl. IA-20 no. 2', edition: '1984' } as const;
export const GB_50545 = { document: 'GB/T 16434, as kept in GB 50545', edition: '1996' } as const;
export const GB_T_26218_PRACTICE = { document: 'Grid practice with GB/T 26218', edition: '' } as const;
export const LIGHTNING_STUDY = { document: 'R. Alipio and others, lightning performance paper', edition: '' } as const;
