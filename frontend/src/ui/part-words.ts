const PARTS: Record<string, string> = {
  string: 'String',
  clearances: 'Clearances',
  clearance: 'Clearances',
  mechanical: 'Mechanical loads',
  towerHead: 'Tower head and swing',
  midSpan: 'Spacing at mid span',
  bay: 'Substation bay',
  system: 'System',
  site: 'Site',
};

const DETAILS: Record<string, string> = {
  voltageSharing: 'voltage along the string',
  pollution: 'pollution',
  lightning: 'lightning',
  switching: 'switching',
  'power-frequency': 'power frequency, wet',
  minimum: 'minimum count',
  extraUnits: 'extra units',
  arcingDevices: 'arcing devices',
  stringLengthWithFittings: 'length with fittings',
  overvoltages: 'overvoltages',
  safetySource: 'distances for people',
};

/** A part of an answer in words, such as "Clearances, lightning". */
export function partWords(part: string): string {
  const [head = '', ...rest] = part.split('.');
  const detail = rest.map(
    (name) =>
      DETAILS[name] ??
      name
        .replace(/([A-Z])/g, ' $1')
        .replaceAll('-', ' ')
        .toLowerCase(),
  );
  return [PARTS[head] ?? head, ...detail].join(', ');
}
