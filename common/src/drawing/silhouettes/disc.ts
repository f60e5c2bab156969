import { curve, line, mirrored, move, rectangle, type Segment } from '../geometry';
import type { InsulatorUnit } from '../../engine/model';

/** Outlines of one cap-and-pin unit on its axis, from the socket at y = 0 to the ball at y = spacing. */
export interface DiscOutline {
  cap: Segment[];
  shell: Segment[];
  pin: Segment[];
}

interface Form {
  /** Heights as shares of the spacing: foot of the cap, lower edge of the rim, crown of the ribs' valleys, tip of the ribs. */
  capFoot: number;
  rim: number;
  valley: number;
  ribTip: number;
  /** Radii of the rib tips as shares of the shell's radius, outer first. */
  ribs: number[];
  /** How far out the crown stays high: small is a flat cone, large a bell. */
  bell: number;
}

const FORMS: Record<'standard' | 'fog' | 'open', Form> = {
  standard: { capFoot: 0.44, rim: 0.69, valley: 0.65, ribTip: 0.72, ribs: [0.72, 0.46], bell: 0.66 },
  fog: { capFoot: 0.42, rim: 0.83, valley: 0.67, ribTip: 0.85, ribs: [0.73, 0.48], bell: 0.84 },
  open: { capFoot: 0.44, rim: 0.58, valley: 0.56, ribTip: 0.56, ribs: [], bell: 0.5 },
};

/** The form of a profile: anti-fog with a deep skirt and long ribs, open profile flat and smooth below. */
export function discOutline(profile: InsulatorUnit['profile'], diameterMm: number, spacingMm: number): DiscOutline {
  const form = FORMS[profile === 'fog' || profile === 'open' ? profile : 'standard'];
  const radius = diameterMm / 2;
  const y = (share: number): number => share * spacingMm;
  const cap = Math.min(Math.max(0.17 * diameterMm, 0.2 * radius), 60);
  const pin = Math.min(Math.max(0.035 * diameterMm, 4), 14);

  const capHalf: Segment[] = [
    move(0, 0),
    line(cap * 0.6, 0),
    line(cap * 0.6, y(0.1)),
    curve(cap * 0.95, y(0.12), cap, y(0.18), cap, y(0.26)),
    line(cap * 1.08, y(form.capFoot)),
    line(0, y(form.capFoot)),
  ];

  const crown = y(form.capFoot - 0.05);
  const rimTop = y(form.rim - 0.055);
  const half: Segment[] = [
    move(0, crown),
    line(cap, crown),
    curve(
      cap + form.bell * (radius - cap),
      crown + 0.1 * (rimTop - crown),
      radius * (0.9 + 0.1 * form.bell),
      crown + 0.45 * (rimTop - crown),
      radius,
      rimTop,
    ),
    curve(radius * 1.0, y(form.rim - 0.01), radius * 0.985, y(form.rim), radius * 0.965, y(form.rim)),
  ];
  let here = { x: radius * 0.965, y: y(form.rim) };
  const wave = (x: number, to: number): void => {
    const middle = (here.x + x) / 2;
    half.push(curve(middle, here.y, middle, to, x, to));
    here = { x, y: to };
  };
  for (const rib of form.ribs) {
    wave(radius * (rib + 0.125), y(form.valley));
    wave(radius * rib, y(form.ribTip));
  }
  wave(Math.max(pin * 1.6, radius * 0.14), y(form.valley));
  half.push(line(0, y(form.valley)));

  return {
    cap: mirrored(capHalf),
    shell: mirrored(half),
    pin: rectangle(-pin, y(form.valley), 2 * pin, y(1) - y(form.valley)),
  };
}
