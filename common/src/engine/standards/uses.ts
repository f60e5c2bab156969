/** Where the figures of each table go, in the words of who reads a sheet; by key of the table. */
export const TABLE_USES: Record<string, string> = {
  'iec-60071-1:range-i': 'Insulation level of a system up to 245 kV, chosen as one row',
  'iec-60071-1:range-ii': 'Insulation level of a system above 245 kV, chosen as one row',
  'iec-60071-1:a1': 'Clearances by the table method: lightning, to earth and between phases',
  'iec-60071-1:a2': 'Clearances by the table method: switching, to earth, above 245 kV',
  'iec-60071-1:a3': 'Clearances by the table method: switching, between phases, above 245 kV',
  'iec-ts-60815:uscd': 'Required creepage and with it the units that pollution asks for',
  'iec-60305:units': 'Catalogue: cap and pin units and their strength classes',
  'ansi-c29.2:units': 'Catalogue: suspension units and their strength classes, North American basis',
  'string-flashover-254x146': 'Units that the power-frequency withstand asks for, discs of 254 x 146 mm',
  'en-50341-1:clearances': 'Clearances of a line by the empirical method',
  'en-50341-1:altitude': 'Strength of air gaps at altitude, line methods only',
  'en-50341-1:gap-factors': 'Gap factor of the string in its surroundings and of the theoretical method',
  'iec-61936-1:clearances': 'Second opinion on clearances of stations, compared with the table method',
  'stations:safety-distances': 'Safety distances in stations',
  'national:altitude-rules': 'Altitude rules of other countries, beside the factor that is used',
  'c37.30:altitude': 'Altitude factor of distances and counts, North American basis',
  'c37.32:bus-clearances': 'Insulation levels and clearances of stations, North American basis',
  'rus-1724e-200:suspension-levels': 'Least number of units by voltage, North American basis',
  'rus-1724e-200:contamination': 'Required leakage by contamination level, North American basis',
  'rus-1724e-200:swing-clearances': 'Clearances of a swung conductor, North American basis',
  'trade:disc-counts': 'Rule-of-thumb cards, for checking only',
};

/** The same for formulas, by their topic: the part of the id before its dot. */
export const FORMULA_USES: Record<string, string> = {
  'air-gaps': 'Strength of air gaps: dry arc of the string and clearances of lines',
  atmosphere: 'Correction for altitude and air density',
  clearances: 'Clearances by each method',
  overvoltage: 'Insulation level and overvoltages',
  pollution: 'Required creepage',
  string: 'Number of units, lengths and test levels of the string',
  'string-voltage': 'Sharing of the voltage along the string; never the number of units',
  mechanical: 'Loads on the string and its strength',
  risk: 'Risk of flashover',
  worksheet: 'Insulation level worksheet',
};
