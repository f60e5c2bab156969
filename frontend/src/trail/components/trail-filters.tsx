import { ACTION_LABELS, contract, type Project } from '@bellgap/common/api';
import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useEffect, useRef, useState } from 'react';
import { queryOf } from '../../api/queries';
import { TableFilters } from '../../ui/data-table/table-filters';
import type { ListState } from '../../ui/data-table/use-list-state';
import { readDay } from '../../ui/fields';
import { FIELD_CHOICES } from '../model/fields';

const PAUSE_MS = 300;

interface BoxProps {
  list: ListState;
  name: 'person' | 'from' | 'to';
  label: string;
  /** The text as the filter takes it; null while it cannot be read. */
  read: (text: string) => string | null;
}

/** A filter that is typed; it narrows after a pause and once it can be read. */
function FilterBox({ list, name, label, read }: BoxProps) {
  const set = list.filters[name] ?? '';
  const [typed, setTyped] = useState(set);
  const [known, setKnown] = useState(set);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  if (known !== set) {
    setKnown(set);
    setTyped(set);
  }
  useEffect(() => () => clearTimeout(timer.current), []);
  const unreadable = typed.trim() !== '' && read(typed.trim()) === null;

  return (
    <input
      className="plain-input trail-box"
      aria-label={label}
      aria-invalid={unreadable}
      placeholder={label}
      title={unreadable ? 'Write the day as year-month-day, such as 2027-10-31' : undefined}
      value={typed}
      onChange={({ target }) => {
        setTyped(target.value);
        clearTimeout(timer.current);
        const text = target.value.trim();
        const means = text === '' ? '' : read(text);
        if (means === null) return;
        timer.current = setTimeout(() => {
          setKnown(means);
          list.change({ [name]: means || undefined });
        }, PAUSE_MS);
      }}
    />
  );
}

const ACTIONS = Object.entries(ACTION_LABELS).map(([value, label]) => ({ value, label }));

export function TrailFilters({ list }: { list: ListState }) {
  const projects = useQuery(queryOf(contract.projects, { query: { limit: '200', sort: 'code' } }));
  const codes = (projects.data?.items ?? []).map(({ code }: Project) => ({ value: code, label: code }));
  const { project } = list.filters;
  if (project && !codes.some(({ value }) => value === project)) codes.push({ value: project, label: project });
  const { specification, entityId } = list.filters;
  return (
    <div className="trail-filters">
      <FilterBox list={list} name="person" label="Who" read={(text) => text} />
      <FilterBox list={list} name="from" label="From, year-month-day" read={readDay} />
      <FilterBox list={list} name="to" label="To, year-month-day" read={readDay} />
      <TableFilters
        list={list}
        filters={[
          { name: 'project', label: 'Project', choices: codes },
          { name: 'action', label: 'What', choices: ACTIONS },
          { name: 'path', label: 'Field', choices: FIELD_CHOICES },
        ]}
      />
      {(specification ?? entityId) && (
        <p className="trail-narrowed">
          {specification ? (
            <>
              Only specification <b className="num">{specification}</b>, over all its revisions.
            </>
          ) : (
            'Only one record.'
          )}{' '}
          <Button
            type="link"
            onClick={() => list.change({ specification: undefined, entity: undefined, entityId: undefined })}
          >
            All records
          </Button>
        </p>
      )}
    </div>
  );
}
