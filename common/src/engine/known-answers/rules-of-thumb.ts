import { evaluate } from '../evaluate';
import { aContext, aLine, rangeOneLevel } from '../testing/specifications';
import type { KnownAnswer } from './known-answer';

const units = (nominalVoltageKv: number, highestVoltageKv: number, powerFrequencyKv: number, lightningKv: number) =>
  evaluate(
    aLine({
      system: { nominalVoltageKv, highestVoltageKv, insulationLevel: rangeOneLevel(powerFrequencyKv, lightningKv) },
    }),
    aContext(),
  ).string?.units ?? null;

/** Counts in service on clean sites, standard discs of 146 mm, cross-arm, up to 1000 m. */
export const COUNTS_IN_SERVICE: KnownAnswer[] = [
  {
    source: 'examination question bank (seen): five discs for 66 kV, ten for 132 kV; common practice 9 to 10',
    title: 'ordinary 66 and 132 kV strings',
    computed: () => ({ at66Kv: units(66, 72.5, 140, 325), at132Kv: units(132, 145, 275, 650) }),
    printed: { at66Kv: 5, at132Kv: 10 },
    within: { at66Kv: 0, at132Kv: 1 },
    why: 'a rule of thumb differs by a disc',
  },
  {
    source:
      'R. Alipio and others, lightning performance paper: 14 units of 146 mm on 230 kV lines; common practice 13 to 15',
    title: 'ordinary 220 kV string',
    computed: () => ({ at220Kv: units(220, 245, 460, 1050) }),
    printed: { at220Kv: 14 },
    within: 0,
    why: 'the same height of insulation',
  },
];
