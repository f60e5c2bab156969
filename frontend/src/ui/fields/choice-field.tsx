import { Input, Select } from 'antd';
import { memo, type ReactNode } from 'react';
import { FieldFrame, noteIdOf, type FieldWords } from './field-frame';

export interface Choice {
  value: string;
  label: string;
  /** What the closed field shows, where the label is too long for it. */
  short?: string;
  /** Further words of the row in the open list. */
  detail?: string;
  /** Heading under which the list shows it. */
  group?: string;
}

export interface ChoiceFieldProperties extends FieldWords {
  path: string;
  value: string | null;
  choices: readonly Choice[];
  onChange: (path: string, value: string | null) => void;
  onLeave?: ((path: string) => void) | undefined;
  /** Typing looks for a choice; for long lists. */
  searchable?: boolean | undefined;
  loading?: boolean | undefined;
  placeholder?: string | undefined;
  /** Width of the open list where it needs more than the field has. */
  listWidth?: number | undefined;
  empty?: ReactNode;
}

interface Option {
  value: string;
  label: string;
  shown: string;
  detail?: string | undefined;
}

function optionOf({ value, label, short, detail }: Choice): Option {
  return { value, label, shown: short ?? label, detail };
}

function grouped(choices: readonly Choice[]) {
  if (!choices.some(({ group }) => group)) return choices.map(optionOf);
  const groups = new Map<string, Option[]>();
  for (const choice of choices) {
    const group = choice.group ?? '';
    groups.set(group, [...(groups.get(group) ?? []), optionOf(choice)]);
  }
  return [...groups].map(([label, options]) => ({ label, options }));
}

/** One of a closed list; nothing preselected, and it can go back to "not known". */
export const ChoiceField = memo(function ChoiceField({
  path,
  value,
  choices,
  onChange,
  onLeave,
  searchable = false,
  loading = false,
  placeholder = 'choose',
  listWidth,
  empty,
  readOnly,
  ...words
}: ChoiceFieldProperties) {
  const chosen = choices.find((choice) => choice.value === value);
  const describedBy = words.error || words.note || words.mark ? noteIdOf(words.id) : undefined;
  if (readOnly) {
    return (
      <FieldFrame {...words}>
        <Input
          id={words.id}
          readOnly
          value={chosen?.short ?? chosen?.label ?? value ?? ''}
          aria-describedby={describedBy}
        />
      </FieldFrame>
    );
  }
  return (
    <FieldFrame {...words}>
      <Select<string, Option>
        id={words.id}
        value={value}
        options={grouped(choices) as Option[]}
        optionLabelProp="shown"
        showSearch={
          searchable && {
            filterOption: (typed, option) =>
              `${option?.label ?? ''} ${option?.detail ?? ''}`.toLowerCase().includes(typed.trim().toLowerCase()),
          }
        }
        optionRender={({ data }) => (
          <span className="bg-choice">
            <span>{data.label}</span>
            {data.detail && <small>{data.detail}</small>}
          </span>
        )}
        allowClear
        loading={loading}
        placeholder={placeholder}
        popupMatchSelectWidth={listWidth ?? false}
        notFoundContent={empty}
        status={words.error ? 'error' : ''}
        aria-invalid={words.error ? true : undefined}
        aria-describedby={describedBy}
        onChange={(next) => onChange(path, next ?? null)}
        onBlur={() => onLeave?.(path)}
      />
    </FieldFrame>
  );
});
