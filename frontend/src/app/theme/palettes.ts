/** The colours of the drawing sheet; `tokens.css` gives the same to style sheets, and a test holds the two together. */
export const PALETTES = {
  light: {
    ground: '#F6F3EC',
    surface: '#FFFFFF',
    ink: '#1D2528',
    soft: '#5A6468',
    rule: '#CFC8BA',
    hair: '#E4DED1',
    glass: '#1E6E66',
    glaze: '#7A3E1D',
    'glaze-wash': '#F4E9E1',
    stop: '#B3261E',
    caution: '#8A5A00',
    pass: '#2E6B34',
  },
  dark: {
    ground: '#14191B',
    surface: '#1C2326',
    ink: '#E7E3DA',
    soft: '#A5ABA8',
    rule: '#3A4448',
    hair: '#2A3236',
    glass: '#5FB3A8',
    glaze: '#D9925F',
    'glaze-wash': '#2B221C',
    stop: '#F28B82',
    caution: '#E0B04C',
    pass: '#86C98B',
  },
} as const;

export type ThemeName = keyof typeof PALETTES;
