import { Button } from 'antd';
import type { Saving } from '../model/saving';

const TIME = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit', second: '2-digit' });
const DATE = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

function savedWords(savedAt: string): string {
  const at = new Date(savedAt);
  const isToday = DATE.format(at) === DATE.format(new Date());
  return `saved ${isToday ? '' : `${DATE.format(at)}, `}${TIME.format(at)}`;
}

interface Properties {
  saving: Saving;
  readable: boolean;
  readOnly: boolean;
  onRetry: () => void;
}

/** How the draft stands with the server, in words. */
export function SavingWords({ saving, readable, readOnly, onRetry }: Properties) {
  if (readOnly) return <span className="saving">last {savedWords(saving.savedAt)}, read only</span>;
  const kept = saving.kept ? ', kept in this browser' : ', and this browser cannot keep it';
  if (!readable) return <span className="saving is-open">not saved: a field cannot be read{kept}</span>;
  switch (saving.state) {
    case 'saved':
      return <span className="saving">{savedWords(saving.savedAt)}</span>;
    case 'saving':
      return <span className="saving">saving…</span>;
    case 'unsaved':
      return <span className="saving">not saved yet{kept}</span>;
    case 'unreachable':
      return (
        <span className="saving is-open">
          not saved: no connection{kept}{' '}
          <Button type="link" size="small" onClick={onRetry}>
            try now
          </Button>
        </span>
      );
    case 'signed-out':
      return <span className="saving is-open">not saved: signed out{kept}</span>;
    case 'refused':
      return <span className="saving is-open">not saved: see the marked fields{kept}</span>;
    case 'conflict':
      return <span className="saving is-open">not saved: somebody else saved meanwhile{kept}</span>;
    case 'failed':
      return (
        <span className="saving is-open">
          not saved: {saving.message}
          {kept}{' '}
          <Button type="link" size="small" onClick={onRetry}>
            try again
          </Button>
        </span>
      );
  }
}
