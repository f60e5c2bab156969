import { create } from 'qrcode';

/** A QR code as dark stretches of its rows. */
export interface SquareCode {
  /** Modules of a side, without the quiet zone. */
  size: number;
  runs: { row: number; column: number; length: number }[];
}

/** White modules that a reader wants around the code: ISO/IEC 18004, quiet zone (from memory, not verified). */
export const QUIET_MODULES = 4;

export function squareCodeOf(text: string): SquareCode {
  const { modules } = create(text, { errorCorrectionLevel: 'M' });
  const runs: SquareCode['runs'] = [];
  for (let row = 0; row < modules.size; row += 1) {
    let start = -1;
    for (let column = 0; column <= modules.size; column += 1) {
      const dark = column < modules.size && modules.get(row, column) !== 0;
      if (dark && start < 0) start = column;
      if (!dark && start >= 0) {
        runs.push({ row, column: start, length: column - start });
        start = -1;
      }
    }
  }
  return { size: modules.size, runs };
}

/** Path data of the code, in a square of `side` points that holds its quiet zone too. */
export function squareCodePath({ size, runs }: SquareCode, x: number, y: number, side: number): string {
  const module = side / (size + 2 * QUIET_MODULES);
  const at = (place: number, from: number): string => (from + (place + QUIET_MODULES) * module).toFixed(3);
  return runs
    .map(({ row, column, length }) => {
      const [left, right, top, foot] = [at(column, x), at(column + length, x), at(row, y), at(row + 1, y)];
      return `M${left} ${top}H${right}V${foot}H${left}Z`;
    })
    .join('');
}
