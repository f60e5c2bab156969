import type { DesignBasis, Person, Project, SpecificationRow, StandingBasis } from '@bellgap/common/api';

/** Answers of the server for tests, with fixed values that a test overrides. */

export const aPerson = (given: Partial<Person> = {}): Person => ({
  id: 'person-1',
  email: 't.orvelle@kigc.example',
  name: 'Tamsin Orvelle',
  roles: ['engineer'],
  ...given,
});

export const aProject = (given: Partial<Project> = {}): Project => ({
  id: 'project-1',
  code: 'KL221',
  title: 'Saltgrave - Ondara',
  kind: 'line',
  siteTimeZone: 'Etc/GMT-4',
  paper: 'A4',
  description: '',
  lockVersion: 3,
  updatedAt: '2026-03-12T10:02:31Z',
  updatedBy: 'Tamsin Orvelle',
  specificationCount: 5,
  nominalVoltageKv: 220,
  highestVoltageKv: 245,
  basisNumber: 'DB-KL221',
  basisRevision: 2,
  mayEdit: true,
  ...given,
});

export const aDesignBasis = (given: Partial<DesignBasis> = {}): DesignBasis => ({
  id: 'basis-2',
  number: 'DB-KL221',
  revision: 2,
  basis: 'iec',
  system: {
    nominalVoltageKv: 220,
    highestVoltageKv: 245,
    frequencyHz: 50,
    neutralEarthing: 'effective',
    earthFault: 'cleared',
    insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
    faultCurrentKa: 31.5,
    faultDurationS: 1,
  },
  rules: { unitsOutForLiveWork: 2, maximumStringKinds: 6 },
  note: 'The highest voltage is 245 kV',
  createdAt: '2026-02-02T09:00:00Z',
  createdBy: 'Tamsin Orvelle',
  ...given,
});

export const aStandingBasis = (given: Partial<StandingBasis> = {}): StandingBasis => ({
  ...aDesignBasis(),
  state: 'draft',
  moves: [],
  allowed: [],
  ...given,
});

export const aSpecificationRow = (given: Partial<SpecificationRow> = {}): SpecificationRow => ({
  id: 'revision-1',
  projectCode: 'KL221',
  number: 'INS-221-003',
  title: 'All strings, Z3',
  kind: 'line',
  label: 'A',
  state: 'draft',
  units: 17,
  insulatorCode: 'U160BL',
  governedBy: 'pollution',
  highestVoltageKv: 245,
  altitudeM: 900,
  pollutionSeverity: 'd',
  worstMarginPercent: 2.7,
  worstCaution: 'caution',
  newerBasisRevision: null,
  draftedBy: 'Tamsin Orvelle',
  savedBy: 'Tamsin Orvelle',
  savedAt: '2026-03-12T10:02:31Z',
  figuresHidden: false,
  dueOn: null,
  returnedAt: null,
  ...given,
});
