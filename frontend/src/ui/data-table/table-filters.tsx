import { Button } from 'antd';
import { useEffect, useRef, useState } from 'react';
import type { ListState } from './use-list-state';

export interface TableFilter {
  name: string;
  label: string;
  choices: { value: string; label: string }[];
}

const PAUSE_MS = 250;

function SearchBox({ list, label }: { list: ListState; label: string }) {
  const [typed, setTyped] = useState(list.search);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const [known, setKnown] = useState(list.search);
  if (known !== list.search) {
    setKnown(list.search);
    setTyped(list.search);
  }
  useEffect(() => () => clearTimeout(timer.current), []);

  return (
    <input
      type="search"
      className="plain-input table-search"
      aria-label={label}
      placeholder={label}
      value={typed}
      onChange={({ target }) => {
        setTyped(target.value);
        clearTimeout(timer.current);
        timer.current = setTimeout(() => list.change({ search: target.value.trim() || undefined }), PAUSE_MS);
      }}
    />
  );
}

interface TableFiltersProps {
  list: ListState;
  searchLabel?: string | undefined;
  filters: TableFilter[];
}

export function TableFilters({ list, searchLabel, filters }: TableFiltersProps) {
  return (
    <div className="table-filters">
      {searchLabel && <SearchBox list={list} label={searchLabel} />}
      {filters.map(({ name, label, choices }) => (
        <select
          key={name}
          aria-label={label}
          className="plain-input table-filter"
          value={list.filters[name] ?? ''}
          onChange={({ target }) => list.change({ [name]: target.value || undefined })}
        >
          <option value="">{label}: all</option>
          {choices.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      ))}
      {list.narrowed && (
        <Button type="link" onClick={list.clear}>
          Show all
        </Button>
      )}
    </div>
  );
}
