/** A published example that is not run, and why. */
export interface LeftOutExample {
  title: string;
  source: string;
  why: string;
}

const SAG = 'Sag and tension are inputs here: the method takes them from the line design and does not compute them.';
const SWING = 'The swing of strings in the tower head is not computed by this method edition.';
const SPACING = 'Spacing of conductors in the span is not computed by this method edition.';
const WIND_MAP = 'The design wind is an input: the method derives none from weather records.';
const LIGHTNING = 'The method assesses withstand; it counts no strokes and no outages by lightning.';

export const LEFT_OUT: readonly LeftOutExample[] = [
  {
    title: 'Swing of a suspension string under wind, one-page calculation',
    source: 'public calculation sheet on swing of insulators',
    why: SWING,
  },
  {
    title: 'Swing angles of a 750 kV line from printed horizontal forces',
    source: 'ChinaXiv 201903.00078V1, wind-swing trips of a 750 kV line',
    why: SWING,
  },
  {
    title: 'Smallest line angle for a jumper that passes a pole without support',
    source: 'geometry of a jumper past a round pole',
    why: SWING,
  },
  {
    title: 'Spacing of conductors at mid-span, 66 kV line',
    source: 'RD 223/2008 ITC-LAT 07, 5.4.1, Tables 15 and 16',
    why: SPACING,
  },
  {
    title: 'Horizontal clearance at supports by sag',
    source: 'NESC (IEEE C2-1997), Rule 235B1b(2) and (4)',
    why: SPACING,
  },
  {
    title: 'Galloping ellipses: single loop, and the form of the brochure',
    source: 'RUS Bulletin 1724E-200; CIGRE Technical Brochure 322 (2007)',
    why: SPACING,
  },
  {
    title: 'Closest distance of two ellipses',
    source: 'A. Antoniou, W.-S. Lu, Practical Optimization (2007), examples 13.5 and 14.5',
    why: SPACING,
  },
  {
    title: 'Sag of level spans with wind and ice, their inverses and clearances',
    source:
      'V. K. Mehta, R. Mehta, Principles of Power System, examples 8.17 to 8.24; J. B. Gupta, Elements of Power System, E2 to E12',
    why: SAG,
  },
  {
    title: 'Spans between supports of different heights, on slopes and over water',
    source:
      'V. K. Mehta, R. Mehta, Principles of Power System, examples 8.24 to 8.27; C. L. Wadhwa, Electrical Power Systems, example 7.4; S. Ray, Electrical Power Systems, examples 5.2 and 5.3; B. L. Theraja, A. K. Theraja, A Textbook of Electrical Technology, examples 41.51 and 41.57',
    why: SAG,
  },
  {
    title: 'Change of state, permissible span, tension from surveyed heights',
    source:
      'J. B. Gupta, Elements of Power System, E14 and E16; A. Chakrabarti and others, A Textbook on Power System Engineering, examples 2.5.5 and 2.5.7',
    why: SAG,
  },
  {
    title: 'Design wind from yearly extremes',
    source: 'EN 50341-1:2001, Annex D, example D.3',
    why: WIND_MAP,
  },
  {
    title: 'Three-year wind as share of the fifty-year wind',
    source: 'EN 50341-1:2001, Annex D, Table D.4',
    why: WIND_MAP,
  },
  {
    title: 'Protective margins of a 220 kV station',
    source: 'M. S. Naidu, V. Kamaraju, High Voltage Engineering, example 8.9, p. 357',
    why: 'Margins of arresters against the insulation of apparatus are not part of strings and clearances.',
  },
  {
    title: 'Flashes collected by a line',
    source: 'A. J. Eriksson, attractive width of a line, as quoted by R. Alipio and others',
    why: LIGHTNING,
  },
  {
    title: 'Probability that the first stroke exceeds the critical current',
    source: 'R. Alipio, A. De Conti, N. Duarte, F. Rachidi, lightning performance of overhead lines, equation 8',
    why: LIGHTNING,
  },
  {
    title: 'Sample sizes for the acceptance of ceramic and glass units',
    source: 'IEC 60383-1, sampling, as quoted on a trade page',
    why: "Acceptance of a delivery is the supplier's and the inspector's; the sheet asks for the test levels only.",
  },
];
