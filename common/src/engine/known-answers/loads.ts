import { caseLoads, iceWeight, loadAngleLimitsDeg, loadPerMetre, windOnIcedConductor } from '../mechanical';
import { MM_PER_IN } from '../quantities';
import { aLoadCase, mechanicalLoads } from '../testing/loads';
import { aLine } from '../testing/specifications';
import { Calculation } from '../trace';
import type { KnownAnswer } from './known-answer';

/** Standard gravity, by which the books turn kilograms and pounds into forces. */
const G = 9.80665;
const KG_PER_LB = 0.45359237;
const M_PER_FT = 0.3048;
const N_PER_M_PER_LB_PER_FT = (KG_PER_LB * G) / M_PER_FT;
const PA_PER_PSF = (KG_PER_LB * G) / M_PER_FT ** 2;
/** Density of ice behind the handbook's 57 pounds to the cubic foot. */
const HANDBOOK_ICE_KG_PER_M3 = (57 * KG_PER_LB) / M_PER_FT ** 3;

const RIGHT_ANGLED_V = { windwardLegM: 3, leewardLegM: 3, attachmentSpacingM: 3 * Math.SQRT2, levelDifferenceM: 0 };

export const LOADS: KnownAnswer[] = [
  {
    source: 'T. Gonen, Electric Power Transmission System Engineering, example 13.2, p. 697',
    title: 'conductor of 1.093 in with 0.5 in of ice and 4 lb per square foot of wind, pounds per foot',
    computed: () => {
      const given = { radialMm: 0.5 * MM_PER_IN, conductorDiameterMm: 1.093 * MM_PER_IN };
      const conductorWeightNPerM = (5399 / 5280) * N_PER_M_PER_LB_PER_FT;
      const iceWeightNPerM = iceWeight({ ...given, densityKgPerM3: HANDBOOK_ICE_KG_PER_M3 });
      const windNPerM = windOnIcedConductor({ ...given, windPressurePa: 4 * PA_PER_PSF });
      const perFoot = (nPerM: number): number => nPerM / N_PER_M_PER_LB_PER_FT;
      return {
        ice: perFoot(iceWeightNPerM),
        vertical: perFoot(conductorWeightNPerM + iceWeightNPerM),
        wind: perFoot(windNPerM),
        resultant: perFoot(loadPerMetre({ conductorWeightNPerM, iceWeightNPerM, windNPerM })),
      };
    },
    printed: { ice: 0.9956, vertical: 2.0182, wind: 0.6977, resultant: 2.1354 },
    within: 0.006,
    why: 'the handbook rounds the ice to 1.25 t (d + t); pi times 57/144 is 1.2435',
  },
  {
    source: 'B. L. Theraja, A. K. Theraja, A Textbook of Electrical Technology, vol. III, example 41.52, p. 1666',
    title: 'conductor of 19.6 mm with 12.5 mm of ice and 30 kg per square metre of wind, kilograms per metre',
    computed: () => {
      const given = { radialMm: 12.5, conductorDiameterMm: 19.6 };
      const iceWeightNPerM = iceWeight({ ...given, densityKgPerM3: 920 });
      const windNPerM = windOnIcedConductor({ ...given, windPressurePa: 30 * G });
      return { total: loadPerMetre({ conductorWeightNPerM: 0.9 * G, iceWeightNPerM, windNPerM }) / G };
    },
    printed: { total: 2.46 },
    within: 0.005,
    why: 'printed to 0.01',
  },
  {
    source: 'statics of a V of two legs; rule published, figures worked out by hand',
    status: 'derived',
    title: 'right-angled V: angles of the load between which no leg is slack',
    computed: () => {
      const { leastDeg = null, mostDeg = null } = loadAngleLimitsDeg(RIGHT_ANGLED_V) ?? {};
      return { leastDeg, mostDeg };
    },
    printed: { leastDeg: -45, mostDeg: 45 },
    within: 1e-9,
    why: 'exact for a right-angled V',
  },
  {
    source: 'public calculation sheet "Insulator swing calculation"',
    title: 'forces on a suspension string: wind on 440 m, weight of 275 m',
    computed: () => {
      const loadCase = aLoadCase({
        conductorWeightNPerM: 15.102,
        windPressurePa: 879.657,
        conductorDiameterMm: 27.73,
        stringWindN: 0,
        stringWeightN: 754.131 / 2,
        hardwareWeightN: 0,
      });
      const mechanical = mechanicalLoads({ windSpanM: 440, weightSpanM: 275, lineAngleDeg: 0, cases: [loadCase] });
      const { verticalN, horizontalN } = caseLoads(
        { mechanical, string: aLine().string!, loadCase, name: 'wind', as: 'case-1' },
        new Calculation(false),
      );
      return { verticalN, horizontalN };
    },
    printed: { verticalN: 4530.182, horizontalN: 10732.865 },
    within: { verticalN: 0.46, horizontalN: 1.1 },
    why: 'forces within 0.01 %; the sheet counts half the weight of the string, which swings',
  },
];
