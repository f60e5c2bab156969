import type { FormValues } from './form';

/** Input that the server does not have yet, kept in this browser under its revision and the version it began from. */
export interface KeptDraft {
  lockVersion: number;
  values: FormValues;
  /** What both sides had when the typing began; tells later who changed what. */
  origin: FormValues;
  /** RFC 3339. */
  keptAt: string;
}

const TYPING = 'bellgap.draft.';
/** Kept input of earlier visits, until its writer has taken it back or discarded it. */
const OFFERED = 'bellgap.offered.';

function isKept(value: unknown): value is KeptDraft {
  const kept = value as Partial<KeptDraft> | null;
  return (
    typeof kept === 'object' &&
    kept !== null &&
    typeof kept.lockVersion === 'number' &&
    typeof kept.keptAt === 'string' &&
    typeof kept.values?.title === 'string' &&
    typeof kept.values.input === 'object' &&
    typeof kept.origin?.input === 'object'
  );
}

function read(key: string): unknown {
  try {
    return JSON.parse(localStorage.getItem(key) ?? 'null');
  } catch {
    return null;
  }
}

function write(key: string, value: unknown): boolean {
  try {
    localStorage.setItem(key, JSON.stringify(value));
    return true;
  } catch {
    return false;
  }
}

function remove(key: string): void {
  try {
    localStorage.removeItem(key);
  } catch {
    // A browser that keeps nothing has nothing to forget.
  }
}

/** True where the browser kept it. */
export function keep(revisionId: string, draft: KeptDraft): boolean {
  return write(TYPING + revisionId, draft);
}

export function forget(revisionId: string): void {
  remove(TYPING + revisionId);
}

/** What earlier visits left unsaved, the newest first; moved aside so that new typing does not write over it. */
export function takeOffers(revisionId: string, isSaved: (kept: KeptDraft) => boolean): KeptDraft[] {
  const left = read(TYPING + revisionId);
  const before = read(OFFERED + revisionId);
  const all = [left, ...(Array.isArray(before) ? (before as unknown[]) : [])]
    .filter(isKept)
    .filter((kept) => !isSaved(kept));
  if (setOffers(revisionId, all)) remove(TYPING + revisionId);
  return all;
}

export function setOffers(revisionId: string, offers: readonly KeptDraft[]): boolean {
  if (offers.length > 0) return write(OFFERED + revisionId, offers);
  remove(OFFERED + revisionId);
  return true;
}
