import { createHash } from 'node:crypto';

/** JSON with sorted keys and so that the same content has the same text everywhere. */
export function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_, child: unknown) =>
    typeof child === 'object' && child !== null && !Array.isArray(child)
      ? Object.fromEntries(Object.entries(child).sort(([one], [other]) => (one < other ? -1 : 1)))
      : child,
  );
}

export function sha256Of(data: string | Uint8Array): string {
  return createHash('sha256').update(data).digest('hex');
}
