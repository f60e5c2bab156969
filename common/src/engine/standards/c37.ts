import type { Status } from '../model';
import { ANSI_C37_30, ANSI_C37_32 } from '../sources';
import type { StandardTable } from './table';

/** Factor on the withstand of external insulation by altitude; a distance is divided by it. */
export interface DielectricAltitudeRow {
  altitudeFt: number;
  /** As printed beside the feet, m. */
  altitudeM: number;
  /** Strength in thin air over that up to 3300 ft. */
  dielectricFactor: number;
  /** The factor of J. P. Nelson, 1984, Table III, where it has that altitude. */
  secondSourceFactor: number | null;
  statusSecondSource: Status | null;
}

/** Phase spacing and ground clearance of outdoor air switches and bus supports. */
export interface BusClearanceRow {
  /** Line to line, kV r.m.s. */
  ratedMaximumVoltageKv: number;
  /** Lightning impulse withstand, kV peak. */
  bilKv: number;
  /** Least distance metal to metal between phases, rigid parts; null is by agreement. */
  metalToMetalIn: number | null;
  metalToMetalMm: number | null;
  /** Least ground clearance. */
  groundMinimumIn: number;
  groundMinimumMm: number;
  /** Recommended ground clearance. */
  groundRecommendedIn: number | null;
  groundRecommendedMm: number | null;
  /** Centre line to centre line, vertical-break switches and bus supports. */
  phaseSpacingIn: number | null;
  phaseSpacingMm: number | null;
}

const factor = (
  altitudeFt: number,
  altitudeM: number,
  dielectricFactor: number,
  secondSourceFactor: number | null,
  status: Status,
  statusSecondSource: Status | null,
): DielectricAltitudeRow & { status: Status } => ({
  altitudeFt,
  altitudeM,
  dielectricFactor,
  secondSourceFactor,
  status,
  statusSecondSource,
});

/** Divides a distance; used on the North American basis only. */
export const C37_30_ALTITUDE: StandardTable<DielectricAltitudeRow> = {
  key: 'c37.30:altitude',
  title: 'Altitude factor of external insulation, North American practice',
  ...ANSI_C37_30,
  clause: 'as in RUS Bulletin 1724E-300:2001 chapter 4',
  reproducedIn: 'J. P. Nelson, IEEE Trans. Ind. Appl. IA-20 no. 2, 1984, Table III (second source)',
  rule: 'next-higher-row',
  identifiedBy: ['altitudeFt'],
  remarks: [
    'No correction up to 3300 ft.',
    'The second source agrees within 0.02 up to 3000 m and lies about 0.07 above at 4000 m.',
  ],
  rows: [
    factor(3300, 1000, 1, 1, 'memory', 'seen'),
    factor(4000, 1200, 0.98, null, 'memory', null),
    factor(5000, 1500, 0.95, 0.94, 'memory', 'seen'),
    factor(6000, 1800, 0.92, null, 'memory', null),
    factor(7000, 2100, 0.89, null, 'memory', null),
    factor(8000, 2400, 0.86, null, 'memory', null),
    factor(9000, 2700, 0.83, null, 'memory', null),
    factor(10000, 3000, 0.8, 0.82, 'memory', 'seen'),
    factor(12000, 3600, 0.75, null, 'memory', null),
    factor(14000, 4200, 0.7, null, 'memory', null),
    factor(16000, 4900, 0.65, null, 'memory', null),
    factor(18000, 5500, 0.61, null, 'memory', null),
    factor(20000, 6100, 0.56, null, 'memory', null),
  ],
};

const bus = (
  ratedMaximumVoltageKv: number,
  bilKv: number,
  metalToMetalIn: number | null,
  metalToMetalMm: number | null,
  groundMinimumIn: number,
  groundMinimumMm: number,
  groundRecommendedIn: number | null,
  groundRecommendedMm: number | null,
  phaseSpacingIn: number | null,
  phaseSpacingMm: number | null,
  status: Status,
): BusClearanceRow & { status: Status } => ({
  ratedMaximumVoltageKv,
  bilKv,
  metalToMetalIn,
  metalToMetalMm,
  groundMinimumIn,
  groundMinimumMm,
  groundRecommendedIn,
  groundRecommendedMm,
  phaseSpacingIn,
  phaseSpacingMm,
  status,
});

// Um, BIL; metal to metal in, mm; ground minimum in, mm; ground recommended in, mm; phase spacing in, mm.
/** Rows by rated maximum voltage and BIL. */
export const C37_32_BUS_CLEARANCES: StandardTable<BusClearanceRow> = {
  key: 'c37.32:bus-clearances',
  title: 'Phase spacing and ground clearance of outdoor stations',
  ...ANSI_C37_32,
  clause: 'Table 5',
  rule: 'rows-as-printed',
  identifiedBy: ['ratedMaximumVoltageKv', 'bilKv'],
  remarks: [
    'Misprints of the page read are put right: 25.60 kV is 25.8, 846 mm is 864, 1520 mm is 1524.',
    '650 kV BIL is printed 98 in (2489 mm); 96 in is the figure remembered for other practice.',
    'From 1550 kV BIL the spacing is by agreement.',
  ],
  rows: [
    bus(8.25, 95, 7, 178, 6, 152, 7.5, 191, 18, 457, 'seen'),
    bus(15.5, 110, 12, 305, 7, 178, 10, 254, 24, 610, 'seen'),
    bus(25.8, 150, 15, 381, 10, 254, 12, 305, 30, 762, 'seen'),
    bus(38, 200, 18, 457, 13, 330, 15, 381, 36, 914, 'seen'),
    bus(48.3, 250, 21, 533, 17, 432, 18, 457, 48, 1219, 'seen'),
    bus(72.5, 250, 21, 533, 17, 432, 18, 457, 48, 1219, 'seen'),
    bus(72.5, 350, 31, 787, 25, 635, 29, 737, 60, 1524, 'seen'),
    bus(121, 350, 31, 787, 25, 635, 29, 737, 60, 1524, 'seen'),
    bus(121, 450, 44, 1118, 34, 864, 39, 991, 72, 1829, 'seen'),
    bus(121, 550, 53, 1346, 42, 1067, 47, 1194, 84, 2134, 'seen'),
    bus(145, 350, 31, 787, 25, 635, 29, 737, 60, 1524, 'seen'),
    bus(145, 450, 44, 1118, 34, 864, 39, 991, 72, 1829, 'seen'),
    bus(145, 550, 53, 1346, 42, 1067, 47, 1194, 84, 2134, 'seen'),
    bus(145, 650, 63, 1600, 50, 1270, 52.5, 1333, 98, 2489, 'seen'),
    bus(169, 450, 44, 1118, 34, 864, 39, 991, 72, 1829, 'seen'),
    bus(169, 550, 53, 1346, 42, 1067, 47, 1194, 84, 2134, 'seen'),
    bus(169, 650, 63, 1600, 50, 1270, 52.5, 1333, 98, 2489, 'seen'),
    bus(169, 750, 72, 1829, 58, 1473, 61.5, 1562, 108, 2743, 'seen'),
    bus(242, 550, 53, 1346, 42, 1067, 47, 1194, 84, 2134, 'seen'),
    bus(242, 650, 63, 1600, 50, 1270, 52.5, 1333, 98, 2489, 'seen'),
    bus(242, 750, 72, 1829, 58, 1473, 61.5, 1562, 108, 2743, 'seen'),
    bus(242, 900, 89, 2261, 71, 1803, 76, 1930, 132, 3353, 'seen'),
    bus(242, 1050, 105, 2667, 83, 2108, 90.5, 2299, 156, 3962, 'seen'),
    bus(362, 1050, 105, 2667, 84, 2134, 90.5, 2299, 156, 3962, 'seen'),
    bus(362, 1300, 110, 2794, 104, 2642, 106, 2692, 174, 4420, 'seen'),
    bus(550, 1550, null, null, 124, 3150, null, null, null, null, 'seen'),
    bus(550, 1800, null, null, 144, 3658, null, null, null, null, 'seen'),
    bus(800, 2050, null, null, 166, 4216, null, null, null, null, 'seen'),
  ],
};
