import { evaluate } from '../evaluate';
import type { InsulatorUnit, PollutionClass, StringResult } from '../model';
import { IEC_TS_60815_USCD } from '../standards';
import { aContext, aDisc, aLine } from '../testing/specifications';
import type { KnownAnswer } from './known-answer';

interface Given {
  highestVoltageKv: number;
  pollutionClass: PollutionClass;
  unit?: Partial<InsulatorUnit>;
}

/** String by pollution alone: no level is given. */
function byPollution({ highestVoltageKv, pollutionClass, unit }: Given): StringResult {
  const input = aLine({
    system: { nominalVoltageKv: null, highestVoltageKv, insulationLevel: null },
    site: { altitudeM: 0, pollution: { class: pollutionClass, type: 'A', basis: 'measured', recheckBy: null } },
  });
  const { string } = evaluate(input, aContext({ insulator: aDisc(unit) }));
  if (string === null) throw new Error('no string');
  return string;
}

const scd1986 = (pollutionClass: PollutionClass): number =>
  IEC_TS_60815_USCD.rows.find((row) => row.pollutionClass === pollutionClass)!.scd1986MmPerKvUm;

const UNITS_160_KN = [
  ['U160BS', 315, 146, 280, 20, 2920, 6300],
  ['U160BSP', 440, 146, 330, 14, 2044, 6160],
  ['U160BL', 340, 170, 280, 19, 3230, 6460],
  ['U160BLP', 525, 170, 330, 12, 2040, 6300],
] as const;

export const CREEPAGE: KnownAnswer[] = [
  {
    source: 'public question and answer on creepage, IEC 60815:1986 level IV',
    title: '33 kV line (Um 36 kV), very heavy pollution, 31 mm per kV of Um',
    computed: () => ({ creepageMm: scd1986('e') * 36 }),
    printed: { creepageMm: 1116 },
    within: 0,
    why: 'exact',
  },
  {
    source: 'public question and answer on creepage, IEC 60815:1986 level IV',
    title: 'the same by the unified figure on Um over root 3',
    computed: () => ({ creepageMm: byPollution({ highestVoltageKv: 36, pollutionClass: 'e' }).creepageRequiredMm }),
    printed: { creepageMm: 1116 },
    within: 1,
    why: '53.7 is 31 times root 3 rounded to 0.1',
  },
  {
    source: 'RD 223/2008 ITC-LAT 07, Table 14',
    title: 'Um 72.5 kV, level II, discs of 295 mm',
    computed: () => ({
      creepageMm: scd1986('c') * 72.5,
      units: byPollution({ highestVoltageKv: 72.5, pollutionClass: 'c' }).units,
    }),
    printed: { creepageMm: 1450, units: 5 },
    within: 0,
    why: 'exact',
  },
  ...UNITS_160_KN.map(
    ([code, creepageMm, spacingMm, diameterMm, units, sectionLengthMm, creepageProvidedMm]): KnownAnswer => ({
      source: 'IEC 60305 units of 160 kN; IEC TS 60815-2:2008 class d; result computed by hand',
      status: 'derived',
      title: `Um 245 kV, class d, ${code}`,
      computed: () => {
        const string = byPollution({
          highestVoltageKv: 245,
          pollutionClass: 'd',
          unit: { code, creepageMm, spacingMm, diameterMm },
        });
        return {
          creepageRequiredMm: string.creepageRequiredMm,
          units: string.units,
          sectionLengthMm: string.sectionLengthMm,
          creepageProvidedMm: string.creepageProvidedMm,
        };
      },
      printed: { creepageRequiredMm: 6124.8, units, sectionLengthMm, creepageProvidedMm },
      within: { creepageRequiredMm: 0.5, units: 0, sectionLengthMm: 0, creepageProvidedMm: 0 },
      why: 'exact counts; U160BL needs 18.01 units and takes 19',
    }),
  ),
];
