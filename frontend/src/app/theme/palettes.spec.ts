import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { PALETTES, type ThemeName } from './palettes';

const css = readFileSync(join(__dirname, 'tokens.css'), 'utf8');
const [light = '', dark = ''] = css.split("[data-theme='dark']");

/** Relative luminance and contrast after WCAG 2.2, definitions "relative luminance" and "contrast ratio". */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((start) => parseInt(hex.slice(start, start + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}
function contrast(one: string, other: string): number {
  const [high = 0, low = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (high + 0.05) / (low + 0.05);
}

describe('palettes', () => {
  test.each(['light', 'dark'] as ThemeName[])('%s stands the same in the style sheet', (name) => {
    const part = name === 'light' ? light : dark;
    for (const [token, colour] of Object.entries(PALETTES[name])) expect(part).toContain(`--bg-${token}: ${colour};`);
  });

  test.each(['light', 'dark'] as ThemeName[])(
    '%s words reach the contrast of level AA on ground and surface',
    (name) => {
      const palette = PALETTES[name];
      for (const ground of [palette.ground, palette.surface])
        for (const words of ['ink', 'soft', 'glass', 'glaze', 'stop', 'caution', 'pass'] as const)
          expect(contrast(palette[words], ground)).toBeGreaterThanOrEqual(4.5);
    },
  );
});
