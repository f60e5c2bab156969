import type { SourceDifference } from '@bellgap/common/api';

export type DifferingFigure = SourceDifference['figures'][number];

/** Document, edition and clause as a reader looks for them. */
export const sourceText = ({ document, edition, clause }: DifferingFigure['source']): string =>
  [document, edition, clause].filter((part) => part !== '' && part !== 'none').join(', ');

/** Quantities under their topics, both in the order in which they come. */
export function byTopic(all: readonly SourceDifference[]): { topic: string; of: SourceDifference[] }[] {
  const topics = [...new Set(all.map(({ topic }) => topic))];
  return topics.map((topic) => ({ topic, of: all.filter((one) => one.topic === topic) }));
}
