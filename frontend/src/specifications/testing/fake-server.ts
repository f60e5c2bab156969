import type {
  AnswerOf,
  contract,
  Evaluation,
  RevisionNote,
  SpecificationInput,
  Sweep,
  WhatIf,
} from '@bellgap/common/api';
import { suspensionCase, discUnit } from '@bellgap/common/drawing/fixtures';
import type { ShownRevision } from '../model/shown-revision';
import { aDesignBasis, aPerson } from '../../testing/builders';

export interface Answered {
  status: number;
  body: unknown;
}

export interface Asked {
  method: string;
  path: string;
  headers: Record<string, string>;
  body: unknown;
}

export const aRevision = (given: Partial<ShownRevision> = {}): ShownRevision => ({
  id: 'revision-1',
  specificationId: 'specification-1',
  projectCode: 'KL221',
  projectTitle: 'Saltgrave - Ondara',
  number: 'INS-221-003',
  title: 'All strings, Z3',
  label: 'A',
  state: 'draft',
  input: suspensionCase.input,
  overrides: [],
  basis: aDesignBasis({ system: suspensionCase.input.system! }),
  newerBasisRevision: null,
  context: { insulator: discUnit(), settings: {} as never, confirmations: [] },
  evaluation: anEvaluation(17),
  lockVersion: 4,
  savedAt: '2026-03-12T10:02:31Z',
  savedBy: 'Tamsin Orvelle',
  drafted: { name: 'Tamsin Orvelle', on: '2026-03-12' },
  checked: null,
  approved: null,
  labels: ['A'],
  derivedFrom: null,
  submitted: null,
  returned: null,
  contentCode: null,
  authors: ['Tamsin Orvelle'],
  openRemarks: 0,
  sheetId: null,
  moves: [{ name: 'submit', allowed: true, why: null }],
  figuresHidden: false,
  mayEdit: true,
  editBarsSigning: false,
  lastSheet: null,
  ...given,
});

/** An answer with another count, so that a test can tell answers apart. */
export function anEvaluation(units: number, given: Partial<Evaluation> = {}): Evaluation {
  const { string } = suspensionCase.evaluation;
  return {
    ...suspensionCase.evaluation,
    trace: [],
    string: string && { ...string, units, unitsBeforeExtra: units },
    ...given,
  };
}

export const problem = (status: number, code: string, more: Record<string, unknown> = {}): Answered => ({
  status,
  body: { type: 'about:blank', title: code, status, detail: code, instance: '', code, errors: [], ...more },
});

interface EvaluationBody {
  input: SpecificationInput;
  trace?: boolean;
}

/** The server at the level of HTTP, with what a test wants it to do. */
export class FakeServer {
  revision = aRevision();
  readonly asked: Asked[] = [];
  evaluate: (body: EvaluationBody) => Promise<Answered | Evaluation> | Answered | Evaluation = () => anEvaluation(17);
  /** Null stands for a server that takes the draft. */
  refuseSave: (() => Answered) | null = null;
  isCutOff = false;
  whatIf: WhatIf = { cases: [] };
  sweep: Sweep = { cells: [] };
  notes: RevisionNote[] = [];
  others: AnswerOf<typeof contract.presence>['others'] = [];
  /** What a move gives back; null refuses it. */
  refuseMove: (() => Answered) | null = null;

  saves(): Asked[] {
    return this.asked.filter(({ method, path }) => method === 'PUT' && !path.endsWith('/presence'));
  }
  evaluations(): Asked[] {
    return this.asked.filter(({ path }) => path.endsWith('/evaluations'));
  }

  readonly fetch = async (address: string, request: RequestInit = {}) => {
    const { method = 'GET', body, headers } = request;
    const [path = ''] = address.replace('/api/v1', '').split('?');
    const asked: Asked = {
      method,
      path,
      headers: headers as Record<string, string>,
      body: typeof body === 'string' ? JSON.parse(body) : undefined,
    };
    this.asked.push(asked);
    if (this.isCutOff) throw new TypeError('Failed to fetch');
    const { status, body: answer } = await this.answer(asked);
    if (request.signal?.aborted) throw new DOMException('aborted', 'AbortError');
    return {
      ok: status < 400,
      status,
      headers: { get: () => null },
      text: () => Promise.resolve(answer === undefined ? '' : JSON.stringify(answer)),
    };
  };

  private async answer({ method, path, body }: Asked): Promise<Answered> {
    if (path === '/sessions/current') return { status: 200, body: { user: aPerson() } };
    if (path === '/insulators') {
      return {
        status: 200,
        body: { items: [discUnit(), discUnit({ code: 'G160-F', creepageMm: 545 })], next: null, previous: null },
      };
    }
    if (path === '/reference/insulation-levels') return { status: 200, body: LEVELS };
    if (path === '/evaluations') {
      const answer = await this.evaluate(body as EvaluationBody);
      return 'status' in answer ? answer : { status: 200, body: answer };
    }
    if (path === '/evaluations/what-if') return { status: 200, body: this.whatIf };
    if (path === '/evaluations/sweep') return { status: 200, body: this.sweep };
    if (path.endsWith('/presence')) return { status: 200, body: { others: this.others } };
    if (path.endsWith('/remarks')) return { status: 200, body: { items: [], open: 0, mayRaise: false } };
    if (path.endsWith('/submissions')) return this.refuseMove?.() ?? this.move({ state: 'in_check', moves: [] });
    if (path.endsWith('/recalls')) return this.refuseMove?.() ?? this.move({ state: 'draft' });
    if (path.includes('/notes')) return this.answerNotes(method, path, body as Partial<RevisionNote>);
    if (method === 'PUT') return this.refuseSave?.() ?? this.take(body as Partial<ShownRevision>);
    if (path.endsWith('/basis')) {
      this.revision = {
        ...this.revision,
        newerBasisRevision: null,
        basis: aDesignBasis({ revision: 3, system: suspensionCase.input.system! }),
        lockVersion: 5,
      };
    }
    return { status: 200, body: this.revision };
  }

  private answerNotes(method: string, path: string, body: Partial<RevisionNote>): Answered {
    if (method === 'GET') return { status: 200, body: this.notes };
    if (method === 'DELETE') {
      this.notes = this.notes.filter(({ id }) => !path.endsWith(`/${id}`));
      return { status: 204, body: undefined };
    }
    const note = { id: 'note-1', writtenBy: 'Tamsin Orvelle', writtenAt: '2026-03-12T10:00:00Z', own: true, ...body };
    this.notes = [note as RevisionNote, ...this.notes];
    return { status: 201, body: note };
  }

  private move(next: Partial<ShownRevision>): Answered {
    this.revision = { ...this.revision, ...next, lockVersion: this.revision.lockVersion + 1 };
    return { status: 201, body: this.revision };
  }

  private take(body: Partial<ShownRevision>): Answered {
    const { lockVersion } = this.revision;
    this.revision = { ...this.revision, ...body, lockVersion: lockVersion + 1, savedAt: '2026-03-12T14:02:31Z' };
    return { status: 200, body: this.revision };
  }
}

const LEVELS = [
  { lightningKv: 1050, powerFrequencyKv: 460 },
  { lightningKv: 950, powerFrequencyKv: 395 },
].map((row) => ({
  highestVoltageKv: 245,
  switchingKv: null,
  switchingPhaseRatio: null,
  bracketed: false,
  reason: null,
  source: { document: 'IEC 60071-1', edition: '2006', clause: 'Table 2', status: 'seen' },
  ...row,
}));
