import type { KnownAnswers } from '@bellgap/common/api';

type Item = KnownAnswers['items'][number];
type Figure = Item['figures'][number];

/** One figure of one example, as the table of answers shows it. */
export interface KnownFigure extends Figure {
  key: string;
  item: Item;
}

export const figuresOf = ({ items }: KnownAnswers): KnownFigure[] =>
  items.flatMap((item) => item.figures.map((figure) => ({ ...figure, key: `${item.id}/${figure.name}`, item })));

export function verdictText({ met, obtained }: Figure): string {
  if (met) return 'met';
  return obtained === null ? 'missed, no figure obtained' : 'missed';
}

/** What a run found, in one sentence. */
export function runText({ items, leftOut }: KnownAnswers): string {
  const missed = items.filter(({ verdict }) => verdict === 'missed').length;
  const examples = `${items.length} ${items.length === 1 ? 'example' : 'examples'}`;
  const found = missed === 0 ? `All ${examples} are met` : `${missed} of ${examples} missed`;
  const outside = `${leftOut.length} ${leftOut.length === 1 ? 'lies' : 'lie'} outside the method`;
  return leftOut.length === 0 ? `${found}.` : `${found}; ${outside}.`;
}
