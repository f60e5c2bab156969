/** The paths of the trail that are a field or stand below it; inputs are written with "input." before them. */
export function pathsOf(asked: string): string[] {
  return /^(input|overrides)(\.|$)/.test(asked) ? [asked] : [asked, `input.${asked}`];
}

/** Whether a path of the trail is a field that was asked for, or stands below it. */
export function isOfField(path: string, asked: string): boolean {
  return pathsOf(asked).some((field) => path === field || path.startsWith(`${field}.`));
}
