import type { Check, SpecificationInput } from '@bellgap/common/api';
import { CHECKLIST, filledPaths, isClearanceCard, isCountCard, type ChecklistItem } from '@bellgap/common/schemas';
import type { INestApplicationContext } from '@nestjs/common';
import { BasisMovesService } from '../basis-moves/basis-moves.service';
import { KNEX, type Database } from '../platform/knex';
import type { SignedIn } from '../platform/person';
import { DesignBasesService } from '../projects/design-bases.service';
import { RegisterService } from '../register/register.service';
import { SheetsService } from '../sheets/sheets.service';
import { SpecificationsService, type RevisionAddress } from '../specifications/specifications.service';
import { withValueAt } from '../platform/values';
import { SealingService } from '../trail/sealing.service';
import { ApprovalService } from '../workflow/approval.service';
import { ChecksService } from '../workflow/checks.service';
import { IssueService } from '../workflow/issue.service';
import { RemarksService } from '../workflow/remarks.service';
import { SubmissionsService } from '../workflow/submissions.service';
import { readAuthor, type Author } from './people';
import type { StoryAct, StoryDocument, StorySave } from './story';
import type { StoryClock } from './story-clock';

export interface Storytellers {
  clock: StoryClock;
  author: (author: Author) => Promise<SignedIn>;
  bases: DesignBasesService;
  basisMoves: BasisMovesService;
  specifications: SpecificationsService;
  sheets: SheetsService;
  submissions: SubmissionsService;
  checks: ChecksService;
  remarks: RemarksService;
  approvals: ApprovalService;
  issues: IssueService;
  register: RegisterService;
  sealing: SealingService;
}

/** The services that make the documents, out of a running application whose clock is that of the story. */
export function storytellersOf(app: INestApplicationContext, clock: StoryClock): Storytellers {
  const knex = app.get<Database>(KNEX);
  return {
    clock,
    author: (author) => readAuthor(author, knex),
    bases: app.get(DesignBasesService),
    basisMoves: app.get(BasisMovesService),
    specifications: app.get(SpecificationsService),
    sheets: app.get(SheetsService),
    submissions: app.get(SubmissionsService),
    checks: app.get(ChecksService),
    remarks: app.get(RemarksService),
    approvals: app.get(ApprovalService),
    issues: app.get(IssueService),
    register: app.get(RegisterService),
    sealing: app.get(SealingService),
  };
}

const RECHECK_BY = 'site.pollution.recheckBy';
const CHECK_CATEGORY = 2;

type Of<K extends StoryAct['kind']> = Extract<StoryAct, { kind: K }>;

/** Does one thing that somebody of the story does to a document. */
export async function perform(document: StoryDocument, act: StoryAct, tellers: Storytellers): Promise<void> {
  const { specifications, sheets, submissions, register, author } = tellers;
  const person = await author(act.by);
  const { projectCode, number } = document;
  const address = { projectCode, number, label: 'latest' };
  switch (act.kind) {
    case 'create':
      await specifications.create(person, projectCode, { number, title: act.title, kind: 'line' });
      return;
    case 'save':
      return save(person, address, act, tellers);
    case 'draw':
      await sheets.draw(person, address);
      return;
    case 'submit':
      return submit(person, address, act, tellers);
    case 'check':
      return check(person, address, act, tellers);
    case 'issue':
      // The running product seals every few seconds; each sheet carries the last seal.
      await tellers.sealing.seal();
      return issue(person, address, act, tellers);
    case 'take-copy': {
      const { sheetId } = await specifications.get(person, address);
      if (sheetId !== null) await register.file(person, sheetId);
      return;
    }
    case 'next':
      await submissions.startNext(person, projectCode, number);
  }
}

async function save(
  person: SignedIn,
  address: RevisionAddress,
  { input: given, overrides: departures = [] }: StorySave,
  { clock, specifications }: Storytellers,
): Promise<void> {
  const { lockVersion, title, input, overrides } = await specifications.get(person, address);
  const changed = departures.reduce<SpecificationInput>((draft, { path, value }) => withValueAt(draft, path, value), {
    ...input,
    ...given,
  });
  const recheckBy = changed.site?.pollution?.recheckBy;
  await specifications.save(person, address, lockVersion, {
    title,
    input: given.site && recheckBy ? withValueAt(changed, RECHECK_BY, clock.day(recheckBy)) : changed,
    overrides: [...overrides, ...departures.map(({ path, reason }) => ({ path, reason }))],
  });
}

async function submit(
  person: SignedIn,
  address: RevisionAddress,
  { dueOn, note }: Of<'submit'>,
  { clock, specifications, submissions }: Storytellers,
): Promise<void> {
  const { lockVersion } = await specifications.get(person, address);
  const given = { checkCategory: CHECK_CATEGORY, dueOn: clock.day(dueOn), note } as const;
  await submissions.submit(person, address, lockVersion, given);
}

async function check(
  person: SignedIn,
  address: RevisionAddress,
  { verdict, note, differenceReason, remarks: raised = [] }: Of<'check'>,
  { specifications, checks, remarks }: Storytellers,
): Promise<void> {
  const { evaluation, input } = await specifications.stored(person, address);
  await checks.enterOwnFigures(person, address, ownFigures(evaluation.ruleOfThumb.rows));
  for (const remark of raised) await remarks.raise(person, address, remark);
  let { mine } = await checks.get(person, address);
  if (verdict !== 'return') {
    ({ mine } = await checks.save(person, address, versionOf(mine), {
      ticks: filledPaths(input).map((path) => ({ path, seenIn: seenIn(path), agreed: true })),
      checklist: (Object.keys(CHECKLIST) as ChecklistItem[]).map((item) => ({
        item,
        answer: 'yes' as const,
        note: '',
      })),
      differenceReason,
      independent: true,
    }));
  }
  await checks.decide(person, address, versionOf(mine), { verdict, note });
}

const versionOf = (mine: Check['mine']): number => mine?.lockVersion ?? 0;

/** What the checker gets by the first rules that say something here. */
function ownFigures(rows: readonly { id: string; unit: string; inRange: boolean; estimate: number | null }[]) {
  const count = rows.find((row) => isCountCard(row) && row.inRange && row.estimate !== null);
  const clearance = rows.find((row) => isClearanceCard(row) && row.inRange && row.estimate !== null);
  return {
    units: count ? Math.round(count.estimate ?? 0) : null,
    unitsCard: count?.id ?? null,
    clearanceMm: clearance ? Math.round(clearance.estimate ?? 0) : null,
    clearanceCard: clearance?.id ?? null,
    note: count && clearance ? '' : 'No rule of thumb says anything here; compared with the tables of the sources',
  };
}

function seenIn(path: string): string {
  if (path.startsWith('system') || path === 'basis') return 'design basis';
  if (path.startsWith('site')) return 'line list and pollution map';
  return path.startsWith('string') ? 'catalogue of the maker' : 'structure drawings';
}

async function issue(
  person: SignedIn,
  address: RevisionAddress,
  { reason }: Of<'issue'>,
  { specifications, approvals, issues }: Storytellers,
): Promise<void> {
  const { lockVersion } = await specifications.get(person, address);
  const { acceptances, laterChanges } = await approvals.of(person, address);
  await issues.issueSigned(person, address, lockVersion, {
    acceptances: acceptances.map((one) => ({ ...one, reason })),
    concessions: [],
    laterChangesReason: laterChanges.length > 0 ? reason : null,
  });
}
