import { cite, DEFINITION } from '../sources';
import { formula } from '../trace';

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
