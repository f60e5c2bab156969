import { contract, type FieldError, type Revision } from '@bellgap/common/api';
import { useCallback, useEffect, useReducer, useRef } from 'react';
import { call } from '../../api/client';
import { useSession } from '../../api/session';
import { formOf, type FormValues, type SaveBody } from '../model/form';
import { forget, keep, type KeptDraft } from '../model/kept-draft';
import { failureOf, type Change, type Saving } from '../model/saving';
import { useForgetLists, type RevisionAddress } from '../queries/use-revision';

const PAUSE_MS = 800;
const RETRY_MS = 5000;
/** One and the same where there are none, so that fields are not drawn anew for nothing. */
const NO_FAULTS: FieldError[] = [];

export interface Draft {
  values: FormValues;
  body: SaveBody;
  /** The body as text: equal text needs no saving. */
  key: string;
  readable: boolean;
}

interface Given {
  first: Revision;
  address: RevisionAddress;
  draft: Draft;
  enabled: boolean;
  onSaved: (revision: Revision) => void;
}

const change = (now: Saving, next: Change): Saving => ({ ...now, ...next });

const begin = (first: Revision): Saving => ({
  state: 'saved',
  savedAt: first.savedAt,
  kept: false,
  faults: NO_FAULTS,
  message: null,
  conflict: null,
  origin: formOf(first),
  originVersion: first.lockVersion,
});

/**
 * Saves a draft by itself: shortly after the last change, on leaving a field and on leaving the page. One save at a
 * time, each from the version that the last one gave. Until the server has it, the input is kept in this browser.
 */
export function useSaving({ first, address, draft, enabled, onSaved }: Given) {
  const { id } = first;
  const { code, number, label } = address;
  const forgetLists = useForgetLists();
  const { dataUpdatedAt: signedInAt } = useSession();
  const [saving, tell] = useReducer(change, first, begin);
  const now = useRef({ draft, saving, enabled, onSaved });
  const savedKey = useRef(draft.key);
  const version = useRef(first.lockVersion);
  const running = useRef<Promise<unknown>>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    now.current = { draft, saving, enabled, onSaved };
  });

  const send = useCallback(
    async ({ body, key, values }: Draft, passive: boolean) => {
      tell({ state: 'saving' });
      try {
        const params = { code, number, label };
        const saved = (await call(contract.saveRevision, {
          params,
          body,
          ifMatch: version.current,
          passive,
        })) as Revision;
        savedKey.current = key;
        version.current = saved.lockVersion;
        const settled = now.current.draft.key === key;
        if (settled) forget(id);
        forgetLists();
        tell({
          state: settled ? 'saved' : 'unsaved',
          savedAt: saved.savedAt,
          faults: NO_FAULTS,
          message: null,
          origin: values,
          originVersion: saved.lockVersion,
        });
        now.current.onSaved(saved);
      } catch (error) {
        tell(failureOf(error));
      }
    },
    [code, number, label, id, forgetLists],
  );

  /** True where the server has what stands in the form. */
  const save = useCallback(
    async (passive: boolean): Promise<boolean> => {
      clearTimeout(timer.current);
      while (running.current) await running.current;
      const { draft: latest, saving: standing, enabled: may } = now.current;
      if (latest.key === savedKey.current) return latest.readable;
      if (!may || !latest.readable || standing.state === 'conflict') return false;
      running.current = send(latest, passive).finally(() => {
        running.current = null;
      });
      await running.current;
      return savedKey.current === now.current.draft.key;
    },
    [send],
  );

  // Typing is kept at once and saved after a pause. A save or a version taken over begins the same anew.
  const inConflict = saving.conflict !== null;
  const { origin, originVersion } = saving;
  const { key, values, readable } = draft;
  useEffect(() => {
    if (!enabled) return;
    clearTimeout(timer.current);
    if (key === savedKey.current && Object.keys(values.unread).length === 0) {
      if (running.current || inConflict) return;
      forget(id);
      tell({ state: 'saved', faults: NO_FAULTS, message: null });
      return;
    }
    const draftOfNow: KeptDraft = { lockVersion: originVersion, values, origin, keptAt: new Date().toISOString() };
    const kept = keep(id, draftOfNow);
    tell(running.current || inConflict ? { kept } : { kept, state: 'unsaved', faults: NO_FAULTS });
    if (readable && !inConflict) timer.current = setTimeout(() => void save(true), PAUSE_MS);
  }, [key, values, readable, enabled, id, save, inConflict, origin, originVersion]);

  const isCutOff = saving.state === 'unreachable';
  useEffect(() => {
    if (!isCutOff) return undefined;
    const again = () => void save(true);
    const interval = setInterval(again, RETRY_MS);
    window.addEventListener('online', again);
    return () => {
      clearInterval(interval);
      window.removeEventListener('online', again);
    };
  }, [isCutOff, save]);
  useEffect(() => {
    if (now.current.saving.state === 'signed-out') void save(false);
  }, [signedInAt, save]);

  useEffect(() => {
    const leave = () => {
      if (document.visibilityState === 'hidden') void save(true);
    };
    document.addEventListener('visibilitychange', leave);
    return () => {
      document.removeEventListener('visibilitychange', leave);
      void save(true);
    };
  }, [save]);

  /** Takes a version of the server as the one that the form begins from. */
  const rebase = useCallback((current: Revision, currentKey: string) => {
    version.current = current.lockVersion;
    savedKey.current = currentKey;
    tell({ ...begin(current) });
  }, []);
  /** Sets kept input of an earlier visit against what stands now. */
  const compareWith = useCallback((kept: KeptDraft, current: Revision) => {
    const { savedBy: changedBy, savedAt: changedAt } = current;
    tell({
      state: 'conflict',
      conflict: { current, changedBy, changedAt },
      origin: kept.origin,
      originVersion: kept.lockVersion,
    });
  }, []);
  const versionNow = useCallback(() => version.current, []);
  return { saving, save, rebase, compareWith, versionNow };
}
