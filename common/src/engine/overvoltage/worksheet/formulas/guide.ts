import { cite, IEC_60071_2 } from '../../../sources';

/**
 * Steps of the insulation level worksheet after IEC 60071-2. From memory, not verified; the printed example of annex H.1
 * (245 kV) is met within 1 kV. Voltages in kV peak, temporary overvoltages in kV r.m.s.
 */
export const guide = (clause: string) => cite(IEC_60071_2, clause, 'memory');
