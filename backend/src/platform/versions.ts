import { versionRequired } from './domain-error';

/** An answer with the version that goes out as its ETag. */
export class Versioned<T> {
  constructor(
    readonly answer: T,
    readonly version: number,
  ) {}
}

export const etagOf = (version: number) => `"${version}"`;

/** The version in If-Match. A list, a weak mark or an asterisk names no single version, which is what a save is made from. */
export function readIfMatch(header: string | undefined): number {
  const match = /^\s*"(\d{1,9})"\s*$/.exec(header ?? '');
  if (!match) throw versionRequired();
  return Number(match[1]);
}
