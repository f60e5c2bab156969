import { contract, type Check, type CheckRecord } from '@bellgap/common/api';
import { useCallback, useEffect, useRef, useState } from 'react';
import { ApiError, failureText } from '../../api/api-error';
import { call } from '../../api/client';
import { bodyOf, draftOf, keyOfDraft, mergedDraft, type CheckDraft } from '../model/draft';
import { useTakeCheck, type CheckAddress } from '../queries/use-check';

const PAUSE_MS = 800;
const RETRY_MS = 5000;

export type CheckSaving =
  { state: 'saved' } | { state: 'unsaved' } | { state: 'saving' } | { state: 'failed'; message: string };

/**
 * A check that saves itself shortly after the last change, one save at a time. Saved in another window meanwhile, both
 * are brought together: what was written here stands, the rest is taken from there.
 */
export function useCheckDraft(address: CheckAddress, record: CheckRecord) {
  const [draft, setDraft] = useState(() => draftOf(record));
  const [saving, tell] = useState<CheckSaving>({ state: 'saved' });
  const [wasMerged, setMerged] = useState(false);
  const version = useRef(record.lockVersion);
  const saved = useRef(draft);
  const now = useRef(draft);
  const running = useRef<Promise<boolean>>(null);
  const take = useTakeCheck(address);
  const { code, number, label } = address;

  const send = useCallback(
    async (sent: CheckDraft, passive: boolean): Promise<boolean> => {
      tell({ state: 'saving' });
      const params = { code, number, label };
      try {
        const check = (await call(contract.saveCheck, {
          params,
          body: bodyOf(sent),
          ifMatch: version.current,
          passive,
        })) as Check;
        version.current = check.mine?.lockVersion ?? version.current;
        saved.current = sent;
        await take(check, false);
        tell({ state: keyOfDraft(now.current) === keyOfDraft(sent) ? 'saved' : 'unsaved' });
        return true;
      } catch (error) {
        const theirs = error instanceof ApiError && error.code === 'newer-version' ? error.problem?.current : null;
        if (!theirs) {
          tell({ state: 'failed', message: failureText(error) });
          return false;
        }
        const current = theirs as CheckRecord;
        const merged = mergedDraft(now.current, draftOf(current), saved.current);
        version.current = current.lockVersion;
        saved.current = draftOf(current);
        now.current = merged;
        setDraft(merged);
        setMerged(true);
        tell({ state: 'unsaved' });
        return false;
      }
    },
    [code, number, label, take],
  );

  /** True where the server has what stands on the page. */
  const save = useCallback(
    async (passive: boolean): Promise<boolean> => {
      for (let attempt = 0; attempt < 3; attempt += 1) {
        while (running.current) await running.current;
        if (keyOfDraft(now.current) === keyOfDraft(saved.current)) return true;
        running.current = send(now.current, passive).finally(() => {
          running.current = null;
        });
        await running.current;
      }
      return keyOfDraft(now.current) === keyOfDraft(saved.current);
    },
    [send],
  );

  const change = useCallback((next: (before: CheckDraft) => CheckDraft) => {
    now.current = next(now.current);
    setDraft(now.current);
    tell({ state: keyOfDraft(now.current) === keyOfDraft(saved.current) ? 'saved' : 'unsaved' });
  }, []);

  const { state } = saving;
  useEffect(() => {
    if (state !== 'unsaved' && state !== 'failed') return undefined;
    const timer = setTimeout(() => void save(true), state === 'unsaved' ? PAUSE_MS : RETRY_MS);
    return () => clearTimeout(timer);
  }, [state, draft, save]);
  useEffect(() => () => void save(true), [save]);

  const versionNow = useCallback(() => version.current, []);
  return { draft, change, saving, save, versionNow, wasMerged };
}
