import * as yup from 'yup';
import {
  ARCING_DEVICES,
  ARRANGEMENTS,
  BASES,
  BAY_GAP_CONDITIONS,
  BAY_SAFETY_SOURCES,
  CLEARANCE_METHODS,
  CONTAMINATION_LEVELS,
  EARTH_FAULTS,
  EN_GAPS,
  FAST_FRONT_SOURCES,
  FREQUENCIES_HZ,
  LOAD_CASE_KINDS,
  LOADING_DISTRICTS,
  MECHANICAL_BASES,
  MID_SPAN_RULES,
  NEUTRAL_EARTHINGS,
  POLLUTION_BASES,
  POLLUTION_CLASSES,
  POLLUTION_TYPES,
  SAFETY_SOURCES,
  SHAPES_PHASE_TO_EARTH,
  SHAPES_PHASE_TO_PHASE,
  SPECIFICATION_KINDS,
  SURROUNDINGS,
  SWING_STATES,
} from '../engine/model';
import { dateText, labelOf, list, oneOf, part, measure, measureOf, text, truth } from './parts';

export const MOST_LOAD_CASES = 20;

/**
 * The schema of a draft: what can be read at all. Every input may be missing or null; what the method makes of a
 * figure, and which combinations of levels and units exist, is the engine's to say.
 */
const insulationLevel = part({
  lightningKv: measureOf('system.insulationLevel.lightningKv'),
  switchingKv: measureOf('system.insulationLevel.switchingKv'),
  powerFrequencyKv: measureOf('system.insulationLevel.powerFrequencyKv'),
  switchingPhaseRatio: measureOf('system.insulationLevel.switchingPhaseRatio'),
  levelHoldsToM: measureOf('system.insulationLevel.levelHoldsToM'),
});

export const systemSchema = part({
  nominalVoltageKv: measureOf('system.nominalVoltageKv'),
  highestVoltageKv: measureOf('system.highestVoltageKv').test(
    'not-below-nominal',
    'The highest voltage must not be below the nominal voltage',
    (highest, { parent }) => {
      const nominal = (parent as { nominalVoltageKv?: number | null }).nominalVoltageKv;
      return typeof highest !== 'number' || typeof nominal !== 'number' || highest >= nominal;
    },
  ),
  frequencyHz: measureOf('system.frequencyHz').oneOf([...FREQUENCIES_HZ, null], 'The frequency is 50 or 60 Hz'),
  neutralEarthing: oneOf('system.neutralEarthing', NEUTRAL_EARTHINGS),
  earthFault: oneOf('system.earthFault', EARTH_FAULTS).test(
    'agrees-with-neutral',
    'With an effectively earthed neutral an earth fault is cleared; it cannot stand for hours',
    (fault, { parent }) =>
      !(fault === 'sustained' && (parent as { neutralEarthing?: string | null }).neutralEarthing === 'effective'),
  ),
  insulationLevel,
  overvoltages: part({
    slowFrontPhaseToEarthKvPeak: measureOf('system.overvoltages.slowFrontPhaseToEarthKvPeak'),
    slowFrontPhaseToPhaseKvPeak: measureOf('system.overvoltages.slowFrontPhaseToPhaseKvPeak'),
    earthFaultFactor: measureOf('system.overvoltages.earthFaultFactor'),
  }),
  faultCurrentKa: measureOf('system.faultCurrentKa'),
  faultDurationS: measureOf('system.faultDurationS'),
});

/** Site severity by class letter, or contamination level; the two are told apart by the key that is given. */
const pollution = part({
  class: oneOf('site.pollution.class', POLLUTION_CLASSES),
  type: oneOf('site.pollution.type', POLLUTION_TYPES),
  contamination: oneOf('site.pollution.contamination', CONTAMINATION_LEVELS).test(
    'one-scale',
    'Give either a pollution class or a contamination level; they are never converted into each other',
    (contamination, { parent }) => !(contamination && (parent as { class?: string | null }).class),
  ),
  basis: oneOf('site.pollution.basis', POLLUTION_BASES),
  recheckBy: dateText('site.pollution.recheckBy'),
});

const legAngle = (path: 'string.vAngleWindwardDeg' | 'string.vAngleLeewardDeg') =>
  measureOf(path).test('v-needs-its-angles', 'A V needs the angle of each leg', (angle, { parent }) => {
    const arrangement = (parent as { arrangement?: string | null }).arrangement;
    return !(arrangement === 'v-suspension' && typeof angle !== 'number');
  });

const string = part({
  insulatorCode: text('string.insulatorCode', 40),
  arrangement: oneOf('string.arrangement', ARRANGEMENTS),
  parallelStrings: measureOf('string.parallelStrings'),
  rodsInSeries: measureOf('string.rodsInSeries'),
  surroundings: oneOf('string.surroundings', SURROUNDINGS),
  spareUnits: measureOf('string.spareUnits'),
  arcingDevices: oneOf('string.arcingDevices', ARCING_DEVICES),
  arcGapMm: measureOf('string.arcGapMm').test(
    'horns-need-a-gap',
    'Horns need the gap between them',
    (gap, { parent }) => {
      const devices = (parent as { arcingDevices?: string | null }).arcingDevices;
      return !(devices === 'horns' && typeof gap !== 'number');
    },
  ),
  hardwareLengthMm: measureOf('string.hardwareLengthMm'),
  vAngleWindwardDeg: legAngle('string.vAngleWindwardDeg'),
  vAngleLeewardDeg: legAngle('string.vAngleLeewardDeg'),
  postAngleDeg: measureOf('string.postAngleDeg'),
  sharing: part({
    pinToEarthRatio: measureOf('string.sharing.pinToEarthRatio'),
    pinToLineRatio: measureOf('string.sharing.pinToLineRatio'),
  }),
});

const clearance = part({
  method: oneOf('clearance.method', CLEARANCE_METHODS),
  shapePhaseToEarth: oneOf('clearance.shapePhaseToEarth', SHAPES_PHASE_TO_EARTH),
  shapePhaseToPhase: oneOf('clearance.shapePhaseToPhase', SHAPES_PHASE_TO_PHASE),
  fastFrontFrom: oneOf('clearance.fastFrontFrom', FAST_FRONT_SOURCES),
  enGap: oneOf('clearance.enGap', EN_GAPS),
  externalClearanceMm: measureOf('clearance.externalClearanceMm'),
  safetySource: oneOf('clearance.safetySource', SAFETY_SOURCES),
});

const mechanical = part({
  basis: oneOf('mechanical.basis', MECHANICAL_BASES),
  subconductors: measureOf('mechanical.subconductors'),
  crossing: truth(labelOf('mechanical.crossing')),
  acceptedStatistically: truth(labelOf('mechanical.acceptedStatistically')),
  windSpanM: measureOf('mechanical.windSpanM'),
  weightSpanM: measureOf('mechanical.weightSpanM'),
  lineAngleDeg: measureOf('mechanical.lineAngleDeg'),
  fittingsStrengthKn: measureOf('mechanical.fittingsStrengthKn'),
  cases: list(
    labelOf('mechanical.cases'),
    part({
      name: text('mechanical.cases.name', 80),
      kind: oneOf('mechanical.cases.kind', LOAD_CASE_KINDS),
      conductorWeightNPerM: measureOf('mechanical.cases.conductorWeightNPerM'),
      windPressurePa: measureOf('mechanical.cases.windPressurePa'),
      conductorDiameterMm: measureOf('mechanical.cases.conductorDiameterMm'),
      iceRadialMm: measureOf('mechanical.cases.iceRadialMm'),
      iceDensityKgPerM3: measureOf('mechanical.cases.iceDensityKgPerM3'),
      conductorTensionN: measureOf('mechanical.cases.conductorTensionN'),
      stringWindN: measureOf('mechanical.cases.stringWindN'),
      stringWeightN: measureOf('mechanical.cases.stringWeightN'),
      hardwareWeightN: measureOf('mechanical.cases.hardwareWeightN'),
    }),
    MOST_LOAD_CASES,
  ),
});

const towerHead = part({
  reachMm: measure('Reach', { above: 0 }),
  faceSlopeDeg: measure('Slope of the face', { atLeast: -60, atMost: 60 }),
  dropMm: measure('Height of the reach above the attachment', {}),
  liveRadiusMm: measure('Radius of the live parts', { atLeast: 0 }),
  reducedClearanceFactor: measure('Reduced clearance factor', { above: 0, atMost: 1 }),
  subconductors: measure('Sub-conductors', { atLeast: 1, atMost: 12, whole: true }),
  windSpanM: measure('Wind span', { atLeast: 0 }),
  weightSpanM: measure('Weight span', {}),
  lineAngleDeg: measure('Line angle', { atLeast: -180, atMost: 180 }),
  stringWeightN: measure('Weight of the string', { atLeast: 0 }),
  states: list(
    'States',
    part({
      state: oneOf('State', SWING_STATES),
      windPressurePa: measure('Wind pressure', { atLeast: 0 }),
      windOnStringN: measure('Wind on the string', { atLeast: 0 }),
      temperatureC: measure('Temperature', { atLeast: -80, atMost: 120 }),
      conductorTensionN: measure('Conductor tension', { atLeast: 0 }),
      conductorWeightNPerM: measure('Conductor weight', { above: 0 }),
      conductorDiameterMm: measure('Conductor diameter', { above: 0 }),
    }),
    10,
  ),
});

const midSpan = part({
  rule: oneOf('Rule', MID_SPAN_RULES),
  spanM: measure('Span', { above: 0 }),
  sagM: measure('Sag', { above: 0 }),
  levelDifferenceM: measure('Difference of level', {}),
  swingDeg: measure('Swing', { atLeast: 0, atMost: 90 }),
  conductorAngleFromVerticalDeg: measure('Angle of the line between conductors', { atLeast: 0, atMost: 90 }),
  loadingDistrict: oneOf('Loading district', LOADING_DISTRICTS),
  ice: part({
    radialMm: measure('Radial ice', { atLeast: 0 }),
    densityKgPerM3: measure('Density of ice', { above: 0 }),
    windPressurePa: measure('Wind pressure with ice', { atLeast: 0 }),
  }),
});

const bay = part({
  gaps: list(
    'Gaps',
    part({
      id: text('Gap', 40),
      kind: text('Kind', 40),
      condition: oneOf('Condition', BAY_GAP_CONDITIONS),
      centreSpacingMm: measure('Centre spacing', { above: 0 }),
      conductorDiameterMm: measure('Conductor diameter', { above: 0 }),
      clearMm: measure('Clear distance', { above: 0 }),
    }),
    100,
  ),
  safetySource: oneOf('Safety distances from', BAY_SAFETY_SOURCES),
  posts: list(
    'Posts',
    part({
      id: text('Post', 40),
      lightningKv: measure('Lightning impulse withstand', { above: 0 }),
      heightMm: measure('Height', { above: 0 }),
      creepageMm: measure('Creepage', { above: 0 }),
      cantileverKn: measure('Cantilever strength', { above: 0 }),
    }),
    100,
  ),
});

export const specificationInputSchema = yup
  .object({
    kind: oneOf('kind', SPECIFICATION_KINDS),
    basis: oneOf('basis', BASES),
    system: systemSchema,
    site: part({ altitudeM: measureOf('site.altitudeM'), pollution }),
    string,
    clearance,
    mechanical,
    towerHead,
    midSpan,
    bay,
  })
  .noUnknown()
  .required();
