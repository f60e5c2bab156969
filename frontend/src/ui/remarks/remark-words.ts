import { trailFieldLabel, type SpecificationInput, type TraceLine } from '@bellgap/common/api';
import { filledPaths } from '@bellgap/common/schemas';

const TRACE = 'trace:';

/** Where a remark on a line of the calculation is tied to. */
export const tracePath = (lineId: string): string => TRACE + lineId;

/** Label of an input; rows of a list are counted. */
export const fieldWords = (path: string): string => trailFieldLabel(path.replace(/\[(\d+)\]/g, '.$1'));

export function lineWords({ id, heading }: Pick<TraceLine, 'id' | 'heading'>): string {
  const [, use] = id.split(':');
  return use === undefined ? heading : `${heading}, ${use.replace(/-/g, ' ')}`;
}

/** What a remark is about, as it is read. */
export function aboutWords(path: string | null, lines: readonly TraceLine[]): string {
  if (path === null) return 'The specification as a whole';
  if (!path.startsWith(TRACE)) return fieldWords(path);
  const line = lines.find(({ id }) => id === path.slice(TRACE.length));
  return line ? `Calculation: ${lineWords(line)}` : 'A line of the calculation that is no longer there';
}

/** All that a remark can be tied to. */
export function remarkPlaces(input: SpecificationInput, lines: readonly TraceLine[]) {
  return [
    ...filledPaths(input).map((path) => ({ value: path, label: fieldWords(path) })),
    ...lines.map((line) => ({ value: tracePath(line.id), label: `Calculation: ${lineWords(line)}` })),
  ];
}
