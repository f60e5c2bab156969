import { contract, type DesignBasis, type Revision, type SpecificationInput } from '@bellgap/common/api';
import type { TestClient } from './test-client';

type System = NonNullable<SpecificationInput['system']>;

/** A 220 kV system of ordinary figures; no value of it is a recommendation. */
export const SYSTEM_220: System = {
  nominalVoltageKv: 220,
  highestVoltageKv: 245,
  frequencyHz: 50,
  neutralEarthing: 'effective',
  earthFault: 'cleared',
  insulationLevel: { lightningKv: 1050, switchingKv: null, powerFrequencyKv: 460, switchingPhaseRatio: null },
  faultCurrentKa: 31.5,
  faultDurationS: 1,
};

/** A whole input of a line on that system, with a class of IEC 60305 that is always in the catalogue. */
export function lineInput(changes: Partial<SpecificationInput> = {}): SpecificationInput {
  return {
    kind: 'line',
    basis: 'iec',
    system: SYSTEM_220,
    site: { altitudeM: 900, pollution: { class: 'd', type: 'A', basis: 'measured', recheckBy: null } },
    string: {
      insulatorCode: 'U160BL',
      arrangement: 'suspension',
      parallelStrings: 1,
      surroundings: 'cross-arm',
      spareUnits: 0,
      arcingDevices: 'none',
      arcGapMm: null,
    },
    ...changes,
  };
}

export async function makeLine(engineer: TestClient, code: string, system: System = SYSTEM_220): Promise<DesignBasis> {
  const project = {
    code,
    title: `Line ${code}`,
    kind: 'line',
    siteTimeZone: 'Etc/GMT-4',
    paper: 'A4',
    description: '',
  };
  expect((await engineer.call(contract.createProject, { body: project })).status).toBe(201);
  return reviseBasis(engineer, code, 0, system);
}

export async function reviseBasis(
  engineer: TestClient,
  code: string,
  version: number,
  system: System,
): Promise<DesignBasis> {
  const body = {
    number: `DB-${code}`,
    basis: 'iec',
    system,
    rules: { unitsOutForLiveWork: null, maximumStringKinds: null },
    note: '',
  };
  const { status, answer } = await engineer.call(contract.saveDesignBasis, { params: { code }, version, body });
  expect(status).toBe(200);
  return answer;
}

export async function begin(engineer: TestClient, code: string, number: string): Promise<Revision> {
  const body = { number, title: `Strings ${number}`, kind: 'line' };
  const { status, answer } = await engineer.call(contract.createSpecification, { params: { code }, body });
  expect(status).toBe(201);
  return answer;
}
