import type { SignedIn } from '../platform/person';
import { DomainError } from '../platform/domain-error';
import { perform, type Storytellers } from './acts';
import {
  BASES,
  BASIS_WAYS,
  DOCUMENTS,
  type StoryAct,
  type StoryBasis,
  type StoryBasisWay,
  type StoryDocument,
} from './story';

export type { Storytellers };

type BasisMove = StoryBasisWay['moves'][number];
type Event = { at: string } & (
  { basis: StoryBasis } | { way: StoryBasisWay; move: BasisMove } | { document: StoryDocument; act: StoryAct }
);

/**
 * Makes the documents of the demonstration that are not there yet, as their people would, all in the order of time;
 * answers what was made.
 */
export async function tellStory(tellers: Storytellers): Promise<string[]> {
  const made: string[] = [];
  for (const event of await eventsToTell(tellers)) {
    tellers.clock.set(event.at);
    if ('basis' in event) {
      await reviseBasis(event.basis, tellers);
      made.push(`${event.basis.projectCode} basis ${event.basis.revision}`);
    } else if ('way' in event) {
      const { move, by, note } = event.move;
      const { projectCode: code, revision } = event.way;
      await tellers.basisMoves.moveSigned(await tellers.author(by), { code, revision }, { move, note });
    } else {
      await perform(event.document, event.act, tellers);
      if (event.act.kind === 'create') made.push(event.document.number);
    }
  }
  return made;
}

async function eventsToTell(tellers: Storytellers): Promise<Event[]> {
  const events: Event[] = [];
  for (const basis of BASES) {
    const { current } = await tellers.bases.history(await tellers.author(basis.by), basis.projectCode);
    if (current && current.revision < basis.revision) events.push({ at: basis.at, basis });
  }
  for (const way of BASIS_WAYS) {
    if (await mayGo(way, tellers)) events.push(...way.moves.map((move) => ({ at: move.at, way, move })));
  }
  for (const document of DOCUMENTS) {
    const [first] = document.acts;
    if (!first || (await exists(tellers, await tellers.author(first.by), document))) continue;
    events.push(...document.acts.map((act) => ({ at: act.at, document, act })));
  }
  return events.sort((one, other) => (one.at < other.at ? -1 : one.at > other.at ? 1 : 0));
}

/** A revision that is not there yet, or is the newest and was not moved; somebody may have gone on by hand. */
async function mayGo(
  { projectCode, revision, moves }: StoryBasisWay,
  { bases, author }: Storytellers,
): Promise<boolean> {
  const { current } = await bases.history(await author(moves[0]!.by), projectCode);
  if (!current || current.revision > revision) return false;
  return current.revision < revision || current.moves.length === 0;
}

async function reviseBasis(step: StoryBasis, { bases, author }: Storytellers): Promise<void> {
  const person = await author(step.by);
  const { current } = await bases.history(person, step.projectCode);
  if (!current) return;
  const { number, basis, system, rules } = current;
  await bases.save(person, step.projectCode, current.revision, {
    number,
    basis: basis as 'iec' | 'north-american',
    system: { ...system, faultCurrentKa: step.faultCurrentKa },
    rules,
    note: step.note,
  });
}

async function exists(
  { specifications }: Storytellers,
  person: SignedIn,
  { projectCode, number }: StoryDocument,
): Promise<boolean> {
  try {
    await specifications.get(person, { projectCode, number, label: 'latest' });
    return true;
  } catch (error) {
    if (error instanceof DomainError && error.code === 'not-found') return false;
    throw error;
  }
}
