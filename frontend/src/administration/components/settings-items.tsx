import { Button } from 'antd';
import type { ReactNode } from 'react';
import type { SchemaForm } from '../../ui/forms/use-schema-form';
import { NEW_ITEMS, type Listed, type SettingsValues } from '../model/settings-values';

interface SettingsItemsProps {
  form: SchemaForm<SettingsValues>;
  list: Listed;
  title: string;
  note: string;
  /** What one of them is called, for the buttons. */
  itemName: string;
  fields: (path: string) => ReactNode;
}

/** A list inside the settings: rows of fields that can be added and taken out. */
export function SettingsItems({ form, list, title, note, itemName, fields }: SettingsItemsProps) {
  const items: unknown[] = form.formik.values.settings[list];
  const set = (next: unknown[]) => void form.formik.setFieldValue(`settings.${list}`, next);
  return (
    <section aria-label={title}>
      <h3>{title}</h3>
      <p>{note}</p>
      {items.length > 0 && (
        <ol className="settings-items">
          {items.map((_, index) => (
            <li key={index}>
              <div className="settings-item-fields">{fields(`settings.${list}[${index}]`)}</div>
              <Button
                size="small"
                aria-label={`Take out ${itemName} ${index + 1}`}
                onClick={() => set(items.filter((__, other) => other !== index))}
              >
                Take out
              </Button>
            </li>
          ))}
        </ol>
      )}
      <div className="schema-form-acts">
        <Button size="small" onClick={() => set([...items, NEW_ITEMS[list]])}>
          Add {itemName}
        </Button>
      </div>
    </section>
  );
}
