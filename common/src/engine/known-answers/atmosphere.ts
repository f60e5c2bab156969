import { altitudeFactor, relativeAirDensity } from '../atmosphere';
import type { KnownAnswer } from './known-answer';

/** 1 mmHg in kPa. */
const KPA_PER_MMHG = 101.325 / 760;
const density = (pressureMmhg: number, temperatureC: number): number =>
  relativeAirDensity({ pressureKpa: pressureMmhg * KPA_PER_MMHG, referencePressureKpa: 101.325, temperatureC });

export const ATMOSPHERE: KnownAnswer[] = [
  {
    source: 'IEC 62271-1:2011, altitude correction, as quoted in a public article on switchgear',
    title: 'a level that holds to 1000 m, used at 2000 m',
    computed: () => ({ altitudeFactor: altitudeFactor({ altitudeM: 2000, originM: 1000, altitudeExponent: 1 }) }),
    printed: { altitudeFactor: 1.13 },
    within: 0.005,
    why: 'printed to 0.01',
  },
  {
    source: 'GB/T 16434-1996, annex B',
    title: 'fall of the polluted flashover voltage of porcelain discs at altitude',
    computed: () =>
      Object.fromEntries(
        [1000, 2000, 3000].map((altitudeM) => [
          `reductionPercentAt${altitudeM}M`,
          100 * (1 - 1 / altitudeFactor({ altitudeM, originM: 0, altitudeExponent: 0.5 })),
        ]),
      ),
    printed: { reductionPercentAt1000M: 6, reductionPercentAt2000M: 11, reductionPercentAt3000M: 17 },
    within: 0.6,
    why: 'printed to whole percent; 11.5 is printed 11',
  },
  {
    source: 'M. S. Naidu, V. Kamaraju, High Voltage Engineering, example 7.3, p. 278',
    title: 'relative air density at 37 degrees C and 750 mmHg',
    computed: () => ({ relativeAirDensity: density(750, 37) }),
    printed: { relativeAirDensity: 0.9327 },
    within: 0.0001,
    why: 'printed to 0.0001',
  },
  {
    source: 'S. Ray, Electrical Power Systems: Concepts, Theory and Practice, example 5.10, p. 173',
    title: 'relative air density at 40 degrees C and 752 mmHg, referred to 25 degrees C',
    computed: () => ({ relativeAirDensity: (density(752, 40) * 298) / 293 }),
    printed: { relativeAirDensity: 0.9418 },
    within: 0.0005,
    why: 'the book rounds 298/760 to 0.392',
  },
];
