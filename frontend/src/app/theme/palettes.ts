/** The colours of the drawing sheet; `tokens.css` gives the same to style sheets, and a test holds the two together. */
export const PALETTES = {
  light: {
    ground: '#f6f3ec',
    surface: '#ffffff',
    ink: '#1d2528',
    soft: '#5a6468',
    rule: '#cfc8ba',
    hair: '#e4ded1',
    glass: '#1e6e66',
    glaze: '#7a3e1d',
    'glaze-wash': '#f4e9e1',
    stop: '#b3261e',
    caution: '#8a5a00',
    pass: '#2e6b34',
  },
  dark: {
    ground: '#14191b',
    surface: '#1c2326',
    ink: '#e7e3da',
    soft: '#a5aba8',
    rule: '#3a4448',
    hair: '#2a3236',
    glass: '#5fb3a8',
    glaze: '#d9925f',
    'glaze-wash': '#2b221c',
    stop: '#f28b82',
    caution: '#e0b04c',
    pass: '#86c98b',
  },
} as const;

export type ThemeName = keyof typeof PALETTES;
