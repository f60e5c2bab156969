import type { LoadCaseInput, MechanicalInput } from '@bellgap/common/api';
import { setIn } from 'formik';
import { valueAt, type FormValues } from './form';

const BLANK_CASE: LoadCaseInput = {
  name: null,
  kind: null,
  conductorWeightNPerM: null,
  windPressurePa: null,
  conductorDiameterMm: null,
  iceRadialMm: null,
  iceDensityKgPerM3: null,
  conductorTensionN: null,
  stringWindN: null,
  stringWeightN: null,
  hardwareWeightN: null,
};

const BLANK: MechanicalInput = {
  basis: null,
  subconductors: null,
  crossing: null,
  acceptedStatistically: null,
  windSpanM: null,
  weightSpanM: null,
  lineAngleDeg: null,
  fittingsStrengthKn: null,
  cases: [BLANK_CASE],
};

const CASES = 'mechanical.cases';
const CASE = /^mechanical\.cases\[(\d+)\]/;

export const casePath = (index: number, name: keyof LoadCaseInput) => `${CASES}[${index}].${name}` as const;

export const casesOf = (values: FormValues): readonly LoadCaseInput[] => valueAt<LoadCaseInput[]>(values, CASES) ?? [];

const setInput = (values: FormValues, path: string, value: unknown): FormValues => ({
  ...values,
  input: setIn(values.input, path, value) as FormValues['input'],
});

export const withLoads = (values: FormValues): FormValues => setInput(values, 'mechanical', BLANK);

export function withoutLoads(values: FormValues): FormValues {
  const unread = Object.fromEntries(Object.entries(values.unread).filter(([path]) => !path.startsWith('mechanical')));
  return { ...setInput(values, 'mechanical', null), unread };
}

/** A further case: the conductor and the string are those of the one before, what acts on them is still to fill in. */
export function withCase(values: FormValues): FormValues {
  const cases = casesOf(values);
  const { conductorWeightNPerM, conductorDiameterMm, stringWeightN, hardwareWeightN } = cases.at(-1) ?? BLANK_CASE;
  const next = { ...BLANK_CASE, conductorWeightNPerM, conductorDiameterMm, stringWeightN, hardwareWeightN };
  return setInput(values, CASES, [...cases, next]);
}

/** Without one case; texts that could not be read move up with their rows. */
export function withoutCase(values: FormValues, index: number): FormValues {
  const unread: Record<string, string> = {};
  for (const [path, text] of Object.entries(values.unread)) {
    const row = CASE.exec(path)?.[1];
    if (row === undefined || Number(row) < index) unread[path] = text;
    else if (Number(row) > index) unread[path.replace(CASE, `${CASES}[${Number(row) - 1}]`)] = text;
  }
  const cases = casesOf(values).filter((_, at) => at !== index);
  return { ...setInput(values, CASES, cases), unread };
}
