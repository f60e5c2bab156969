import type { Approval, Caution, EvaluationContext, TraceLine } from '@bellgap/common/api';
import { ALL_FORMULAS, ALL_TABLES } from '@bellgap/common/engine';
import { CHOICE_LABELS } from '@bellgap/common/schemas';
import { changesBetween } from '../platform/values';
import type { StoredRevision } from '../specifications/specifications.service';

type Content = Pick<StoredRevision, 'title' | 'input' | 'overrides'>;
type Matter = Approval['acceptances'][number];

/** What is read out of a stored evaluation for an approver. It computes nothing anew. */

export function mattersOf({ cautions }: { cautions: readonly Caution[] }, severity: Caution['severity']): Matter[] {
  const found = cautions
    .filter((caution) => caution.severity === severity)
    .map(({ code, field, text }) => [`${code} ${field} ${text}`, { code, field, text }] as const);
  return [...new Map(found).values()];
}

/** Field by field against the revision in force: inputs by their paths, the title, and reasons of overrides. */
export function changesFrom(inForce: Content, next: Content): Approval['changes'] {
  const flat = ({ title, input, overrides }: Content) => ({
    title,
    ...input,
    overrides: Object.fromEntries(overrides.map(({ path, reason }) => [path, reason || '(no reason)'])),
  });
  return Object.entries(changesBetween(flat(inForce), flat(next))).map(([path, { from, to }]) => ({
    path: path.replace(/\.(\d+)(?=\.|$)/g, '[$1]'),
    from: from as object | null,
    to: to as object | null,
  }));
}

/** Choices and figures that rest on an assumption. */
export function assumedOf({ input, evaluation }: Pick<StoredRevision, 'input' | 'evaluation'>): Approval['assumed'] {
  const items: Approval['assumed'] = [];
  const basis = input.site?.pollution?.basis;
  if (basis === 'assumed' || basis === 'estimated') {
    items.push({ path: 'site.pollution.basis', text: `The pollution class is ${basis}, not measured.` });
  }
  if (input.string?.surroundings === 'open') {
    items.push({ path: 'string.surroundings', text: 'The surroundings of the string are not known.' });
  }
  const level = input.system?.insulationLevel;
  if (level && (level.levelHoldsToM ?? null) === null) {
    items.push({
      path: 'system.insulationLevel.levelHoldsToM',
      text: 'The insulation level is taken to hold up to 1000 m; no altitude is given for it.',
    });
  }
  return [...items, ...weakSources(evaluation.trace)];
}

/** Sources of the calculation that nobody has seen in print, each with the lines that rest on it. */
function weakSources(trace: readonly TraceLine[]): Approval['assumed'] {
  const lines = new Map<string, { words: string; headings: string[] }>();
  for (const { heading, source } of trace) {
    if (source.status !== 'memory' && source.status !== 'practice') continue;
    const where = [source.document, source.edition, source.clause].filter((part) => part !== '').join(', ');
    const words = `${CHOICE_LABELS.status[source.status]} (${where})`;
    const found = lines.get(words) ?? { words, headings: [] };
    if (!found.headings.includes(heading)) found.headings.push(heading);
    lines.set(words, found);
  }
  return [...lines.values()].map(({ words, headings }) => ({ path: null, text: `${headings.join('; ')}: ${words}` }));
}

const DISPUTED = /: (\S+)\.$/;

/** Rows and formulas that were used though their print is said to differ. */
export function disputedOf(
  { cautions }: { cautions: readonly Caution[] },
  { confirmations }: Pick<EvaluationContext, 'confirmations'>,
): Approval['disputed'] {
  const keys = cautions
    .filter(({ code }) => code === 'figure-disputed')
    .map(({ text }) => DISPUTED.exec(text)?.[1] ?? text);
  return keys.map((key) => {
    const record = confirmations.find((one) => one.key === key && one.outcome === 'disputed');
    return {
      key,
      title: titleOf(key),
      note: record
        ? `${record.by} recorded on ${record.on} that ${record.edition}, ${record.page} differs`
        : 'The sources that were seen differ from each other',
    };
  });
}

function titleOf(key: string): string {
  const [table] = key.split(':');
  return (
    (ALL_TABLES as readonly { key: string; title: string }[]).find((one) => one.key === table)?.title ??
    ALL_FORMULAS.find(({ definition }) => definition.id === key)?.definition.heading ??
    key
  );
}
