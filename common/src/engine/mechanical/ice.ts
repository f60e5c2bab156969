import type { LoadCaseInput } from '../model';
import { isKnown } from '../quantities';
import { cite, DEFINITION } from '../sources';
import { formula, type Calculation } from '../trace';

/** Weight of radial ice on a conductor. Example: 19.6 mm, 12.5 mm of ice of 920 kg/m3: 11.4 N/m (1.16 kg/m). */
export const iceWeight = formula({
  id: 'mechanical.ice-weight',
  heading: 'Weight of ice',
  source: cite(DEFINITION, 'ring of ice round the conductor', 'derived'),
  expression: 'wi = pi * rho * 9.80665 * t * (d + t) / 1000000',
  symbols: { rho: 'densityKgPerM3', t: 'radialMm', d: 'conductorDiameterMm' },
  result: 'iceWeightNPerM',
  compute: ({
    densityKgPerM3: rho,
    radialMm: t,
    conductorDiameterMm: d,
  }: {
    densityKgPerM3: number;
    radialMm: number;
    conductorDiameterMm: number;
  }) => (Math.PI * rho * 9.80665 * t * (d + t)) / 1e6,
});

/** Wind on a conductor with ice, at right angles to it. */
export const windOnIcedConductor = formula({
  id: 'mechanical.wind-on-iced-conductor',
  heading: 'Wind on the conductor with its ice',
  source: cite(DEFINITION, 'pressure on the projected area', 'derived'),
  expression: 'ww = p * (d + 2 * t) / 1000',
  symbols: { p: 'windPressurePa', d: 'conductorDiameterMm', t: 'radialMm' },
  result: 'windNPerM',
  compute: ({
    windPressurePa: p,
    conductorDiameterMm: d,
    radialMm: t,
  }: {
    windPressurePa: number;
    conductorDiameterMm: number;
    radialMm: number;
  }) => (p * (d + 2 * t)) / 1000,
});

/** Weight with ice and wind together. */
export const loadPerMetre = formula({
  id: 'mechanical.load-per-metre',
  heading: 'Load per metre, weight with ice and wind together',
  source: cite(DEFINITION, 'composition of forces at right angles', 'derived'),
  expression: 'wr = sqrt((w + wi)^2 + ww^2)',
  symbols: { w: 'conductorWeightNPerM', wi: 'iceWeightNPerM', ww: 'windNPerM' },
  result: 'loadNPerM',
  compute: ({
    conductorWeightNPerM: w,
    iceWeightNPerM: wi,
    windNPerM: ww,
  }: {
    conductorWeightNPerM: number;
    iceWeightNPerM: number;
    windNPerM: number;
  }) => Math.sqrt((w + wi) ** 2 + ww ** 2),
});

/** Weight of the conductor with its ice. */
export const icedWeight = formula({
  id: 'mechanical.iced-weight',
  heading: 'Weight of the conductor with its ice',
  source: cite(DEFINITION, 'sum of weights', 'derived'),
  expression: 'wt = w + wi',
  symbols: { w: 'conductorWeightNPerM', wi: 'iceWeightNPerM' },
  result: 'icedWeightNPerM',
  compute: ({
    conductorWeightNPerM: w,
    iceWeightNPerM: wi,
  }: {
    conductorWeightNPerM: number;
    iceWeightNPerM: number;
  }) => w + wi,
});

/** Diameter of the conductor with its ice. Example: 28 mm and 20 mm of ice all round: 68 mm. */
export const icedDiameter = formula({
  id: 'mechanical.iced-diameter',
  heading: 'Diameter of the conductor with its ice',
  source: cite(DEFINITION, 'ring of ice round the conductor', 'derived'),
  expression: 'D = d + 2 * t',
  symbols: { d: 'conductorDiameterMm', t: 'radialMm' },
  result: 'icedDiameterMm',
  compute: ({ conductorDiameterMm: d, radialMm: t }: { conductorDiameterMm: number; radialMm: number }) => d + 2 * t,
});

/** Weight and diameter that a case loads the string with: of the bare conductor, or with the ice that is filled in. */
export function withIce(
  loadCase: LoadCaseInput,
  { name, as }: { name: string; as: string },
  calculation: Calculation,
): Pick<LoadCaseInput, 'conductorWeightNPerM' | 'conductorDiameterMm'> | string {
  const {
    conductorWeightNPerM,
    conductorDiameterMm,
    iceRadialMm: radialMm,
    iceDensityKgPerM3: densityKgPerM3,
  } = loadCase;
  if (!isKnown(radialMm) || radialMm === 0) {
    if (!isKnown(radialMm) && loadCase.kind === 'ice') {
      const text = `Load case "${name}": no ice is filled in; weight and diameter are taken as those of the iced conductor.`;
      calculation.caution('ice-in-conductor-figures', 'info', text, 'mechanical');
    }
    return { conductorWeightNPerM, conductorDiameterMm };
  }
  if (!isKnown(densityKgPerM3)) return 'The density of the ice is not filled in.';
  if (!isKnown(conductorWeightNPerM)) return 'The weight of the conductor is not filled in.';
  if (!isKnown(conductorDiameterMm)) return 'The diameter of the conductor is not filled in.';
  const of = (what: string) => ({ as, heading: `${what}, ${name}` });
  const figures = { densityKgPerM3, radialMm, conductorDiameterMm };
  const iceWeightNPerM = calculation.run(iceWeight, figures, of('Weight of ice'));
  return {
    conductorWeightNPerM: calculation.run(
      icedWeight,
      { conductorWeightNPerM, iceWeightNPerM },
      of('Weight of the conductor with its ice'),
    ),
    conductorDiameterMm: calculation.run(
      icedDiameter,
      { conductorDiameterMm, radialMm },
      of('Diameter of the conductor with its ice'),
    ),
  };
}
