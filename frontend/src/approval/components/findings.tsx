import type { Approval } from '@bellgap/common/api';
import { fieldOf } from '@bellgap/common/schemas';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../app/paths';
import { SeverityShape } from '../../ui/caution';
import { Sheet } from '../../ui/page/sheet';
import { partWords } from '../../ui/part-words';

interface FindingsProps {
  anchor: string;
  title: string;
  note?: string;
  items: readonly { key: string; head: ReactNode; text: ReactNode }[];
}

function Findings({ anchor, title, note, items }: FindingsProps) {
  if (items.length === 0) return null;
  return (
    <div id={anchor}>
      <Sheet title={title} note={note}>
        <ul className="findings">
          {items.map(({ key, head, text }) => (
            <li key={key}>
              {head && <b>{head}</b>}
              <span>{text}</span>
            </li>
          ))}
        </ul>
      </Sheet>
    </div>
  );
}

const fieldWords = (path: string | null): string | null => (path === null ? null : (fieldOf(path)?.label ?? path));

/** What rests on less than a seen figure, what is left out, and what departs: whatever there is of it. */
export function AllFindings({ approval }: { approval: Approval }) {
  const { assumed, disputed, notAssessed, overrides, cautions } = approval;
  return (
    <>
      <Findings
        anchor="assumed"
        title="Assumed"
        note="rests on a choice or a source that nobody has seen proof of"
        items={assumed.map(({ path, text }) => ({ key: `${path} ${text}`, head: fieldWords(path), text }))}
      />
      <Findings
        anchor="disputed"
        title="Disputed"
        note="the print is said to differ from what was used"
        items={disputed.map(({ key, title, note }) => ({
          key,
          head: <Link to={paths.table.to(key)}>{title}</Link>,
          text: note,
        }))}
      />
      <Findings
        anchor="not-assessed"
        title="Not assessed"
        note="never to be taken as passed"
        items={notAssessed.map(({ part, why }) => ({ key: part + why, head: partWords(part), text: why }))}
      />
      <Findings
        anchor="overrides"
        title="Departs from the design basis"
        items={overrides.map(({ path, reason }) => ({
          key: path,
          head: fieldWords(path),
          text: reason || 'No reason is given.',
        }))}
      />
      <Findings
        anchor="cautions"
        title="Cautions"
        items={cautions.map(({ code, field, text }) => ({
          key: code + text,
          head: (
            <>
              <SeverityShape severity="caution" /> {fieldWords(field) ?? 'caution'}
            </>
          ),
          text,
        }))}
      />
    </>
  );
}
