const DELAY_MS = 50;

/** Writes lines some at a time, because each write to the log holds the process up; what waits at its end is written then. */
export function lineBatch(write: (text: string) => void): (line: string) => void {
  let waiting: string[] = [];
  const flush = (): void => {
    const text = waiting.join('');
    waiting = [];
    if (text) write(text);
  };
  process.once('exit', flush);
  return (line) => {
    if (waiting.push(line) === 1) setTimeout(flush, DELAY_MS);
  };
}
