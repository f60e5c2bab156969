import type { RevisionNote } from '@bellgap/common/api';
import { Button } from 'antd';
import { failureText } from '../../../api/api-error';
import { Moment } from '../../../ui/moment';
import type { RevisionAddress } from '../../queries/use-revision';
import { useNoteActs, useRevisionNotes } from '../../queries/use-what-if';
import { CaseFiguresList } from './cases';
import type { CaseFigures } from '../../model/what-if';

/** Cases that were kept, with their numbers as they stood then. */
export function NotesPart({ address }: { address: RevisionAddress }) {
  const { data, error } = useRevisionNotes(address);
  const { remove } = useNoteActs(address);
  return (
    <section aria-labelledby="what-if-notes">
      <h3 id="what-if-notes">Notes of this revision</h3>
      {error && <p className="bg-field-error">{failureText(error)}</p>}
      {remove.error && (
        <p className="bg-field-error" role="alert">
          {failureText(remove.error)}
        </p>
      )}
      {data?.length === 0 && (
        <p className="zone-note">None yet. Keep a case above, and it stands here with its numbers.</p>
      )}
      <ul className="what-if-cases">
        {(data as RevisionNote[] | undefined)?.map((note) => (
          <li key={note.id}>
            <div className="what-if-head">
              <h4>{note.title}</h4>
              <span>
                {note.writtenBy}, <Moment at={note.writtenAt} />
              </span>
            </div>
            {note.text !== '' && <p className="what-if-text">{note.text}</p>}
            <NoteFigures figures={note.figures as { before: CaseFigures; after: CaseFigures } | null} />
            {note.own && (
              <Button
                size="small"
                loading={remove.isPending && remove.variables === note.id}
                onClick={() => remove.mutate(note.id)}
                aria-label={`Delete the note: ${note.title}`}
              >
                Delete
              </Button>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}

function NoteFigures({ figures }: { figures: { before: CaseFigures; after: CaseFigures } | null }) {
  return figures && <CaseFiguresList before={figures.before} after={figures.after} />;
}
