import type { SpecificationInput } from '@bellgap/common/api';
import { DomainError } from '../platform/domain-error';
import type { SignedIn } from '../platform/person';
import type { DesignBasesService } from '../projects/design-bases.service';
import type { SheetsService } from '../sheets/sheets.service';
import type { SpecificationsService } from '../specifications/specifications.service';
import { withValueAt } from '../specifications/values';
import type { Author } from './people';
import type { StoryClock } from './story-clock';
import { STORY, type StorySave, type StoryStep } from './story';

export interface Storytellers {
  clock: StoryClock;
  bases: DesignBasesService;
  specifications: SpecificationsService;
  sheets: SheetsService;
  author: (author: Author) => Promise<SignedIn>;
}

const RECHECK_BY = 'site.pollution.recheckBy';

type BasisStep = Extract<StoryStep, { kind: 'basis' }>;
type SpecificationStep = Extract<StoryStep, { kind: 'specification' }>;

/** Makes the documents of the demonstration that are not there yet, as their authors would; answers what was made. */
export async function tellStory(tellers: Storytellers): Promise<string[]> {
  const made: string[] = [];
  for (const step of STORY) {
    const isNew = step.kind === 'basis' ? await reviseBasis(step, tellers) : await writeSpecification(step, tellers);
    if (isNew) made.push(step.kind === 'basis' ? `${step.projectCode} basis ${step.revision}` : step.number);
  }
  return made;
}

async function reviseBasis(step: BasisStep, { clock, bases, author }: Storytellers): Promise<boolean> {
  const person = await author(step.by);
  const { current } = await bases.history(person, step.projectCode);
  if (!current || current.revision >= step.revision) return false;
  clock.set(step.at);
  const { number, basis, system, rules } = current;
  await bases.save(person, step.projectCode, current.revision, {
    number,
    basis: basis as 'iec' | 'north-american',
    system: { ...system, faultCurrentKa: step.faultCurrentKa },
    rules,
    note: step.note,
  });
  return true;
}

async function writeSpecification(step: SpecificationStep, tellers: Storytellers): Promise<boolean> {
  const { clock, specifications, sheets, author } = tellers;
  const person = await author(step.by);
  const address = { projectCode: step.projectCode, number: step.number, label: 'latest' };
  if (await exists(specifications, person, address)) return false;
  clock.set(step.at);
  await specifications.create(person, step.projectCode, { number: step.number, title: step.title, kind: 'line' });
  for (const save of step.saves) {
    clock.set(save.at);
    await saveDraft(save, address, tellers);
  }
  if (step.sheetAt) {
    clock.set(step.sheetAt);
    await sheets.draw(person, address);
  }
  return true;
}

async function saveDraft(
  save: StorySave,
  address: { projectCode: string; number: string; label: string },
  { clock, specifications, author }: Storytellers,
): Promise<void> {
  const person = await author(save.by);
  const { lockVersion, title, input, overrides } = await specifications.get(person, address);
  const departures = save.overrides ?? [];
  const changed = departures.reduce<SpecificationInput>((draft, { path, value }) => withValueAt(draft, path, value), {
    ...input,
    ...save.input,
  });
  const recheckBy = changed.site?.pollution?.recheckBy;
  await specifications.save(person, address, lockVersion, {
    title,
    input: save.input.site && recheckBy ? withValueAt(changed, RECHECK_BY, clock.day(recheckBy)) : changed,
    overrides: [...overrides, ...departures.map(({ path, reason }) => ({ path, reason }))],
  });
}

async function exists(
  specifications: SpecificationsService,
  person: SignedIn,
  address: { projectCode: string; number: string; label: string },
): Promise<boolean> {
  try {
    await specifications.get(person, address);
    return true;
  } catch (error) {
    if (error instanceof DomainError && error.code === 'not-found') return false;
    throw error;
  }
}
