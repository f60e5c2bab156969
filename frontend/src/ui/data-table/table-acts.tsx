import { App, Button } from 'antd';
import { useState } from 'react';
import { failureText } from '../../api/api-error';
import type { Column } from './columns';
import { saveFile, toCsv, toTsv } from './spreadsheet';

interface TableActsProps<Row> {
  /** Name of the file, without its ending. */
  name: string;
  columns: readonly Column<Row>[];
  /** All rows of the list, also those on other pages. */
  allRows: () => Promise<readonly Row[]> | readonly Row[];
  /** Address of a file with all rows, where the server makes it. */
  file?: string | undefined;
}

/** Copy for a spreadsheet, and a file of the same. */
export function TableActs<Row>({ name, columns, allRows, file }: TableActsProps<Row>) {
  const { message } = App.useApp();
  const [busy, setBusy] = useState<'copy' | 'csv' | null>(null);

  const run = async (act: 'copy' | 'csv') => {
    setBusy(act);
    try {
      const rows = await allRows();
      if (act === 'copy') {
        await navigator.clipboard.writeText(toTsv(rows, columns));
        message.success(`Copied ${rows.length} ${rows.length === 1 ? 'row' : 'rows'}; paste them into a spreadsheet`);
      } else {
        saveFile(`${name}.csv`, toCsv(rows, columns), 'text/csv;charset=utf-8');
      }
    } catch (error) {
      message.error(
        error instanceof DOMException
          ? 'This browser did not allow the copy. Use the CSV file instead.'
          : failureText(error),
      );
    } finally {
      setBusy(null);
    }
  };

  return (
    <div className="table-acts">
      <Button
        size="small"
        onClick={() => void run('copy')}
        loading={busy === 'copy'}
        title={file === undefined ? 'Copy all rows for a spreadsheet' : 'Copy the rows shown for a spreadsheet'}
      >
        Copy
      </Button>
      {file === undefined ? (
        <Button
          size="small"
          onClick={() => void run('csv')}
          loading={busy === 'csv'}
          title="Save all rows as a CSV file"
        >
          CSV
        </Button>
      ) : (
        <Button size="small" href={file} download={`${name}.csv`} title="Save all rows as a CSV file">
          CSV
        </Button>
      )}
    </div>
  );
}
