import { contract, type Revision } from '@bellgap/common/api';
import { Button } from 'antd';
import { useState, type ReactNode } from 'react';
import { failureText } from '../../api/api-error';
import { addressOf, call } from '../../api/client';
import { paramsOf, type RevisionAddress } from '../queries/use-revision';

interface Properties {
  address: RevisionAddress;
  lastSheet: Revision['lastSheet'];
  /** Brings the draft to the server first; false where that did not work. */
  beforeDrawing: () => Promise<boolean>;
  /** The content as it stands in the form; another one makes the last sheet an older one. */
  contentKey: string;
  /** Further acts, beside drawing the sheet. */
  children?: ReactNode;
}

function openFile(href: string, name: string): void {
  const link = document.createElement('a');
  link.href = href;
  link.download = name;
  document.body.append(link);
  link.click();
  link.remove();
}

/** Draws the sheet as PDF on request and downloads it; the last one drawn stays to be had. */
export function SheetActions({ address, lastSheet, beforeDrawing, contentKey, children }: Properties) {
  const [isDrawing, setDrawing] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const [drawnKey, setDrawnKey] = useState(lastSheet?.current ? contentKey : null);
  const [hasSheet, setHasSheet] = useState(lastSheet !== null);
  const file = addressOf(contract.sheetFile, { params: paramsOf(address) });
  const name = `${address.number}-${address.label}.pdf`;

  const draw = async () => {
    setDrawing(true);
    setFailure(null);
    try {
      if (!(await beforeDrawing())) {
        setFailure('The draft is not saved yet; the sheet is drawn from what is saved.');
        return;
      }
      await call(contract.drawSheet, { params: paramsOf(address) });
      setHasSheet(true);
      setDrawnKey(contentKey);
      openFile(file, name);
    } catch (error) {
      setFailure(failureText(error));
    } finally {
      setDrawing(false);
    }
  };

  return (
    <div className="sheet-actions">
      {hasSheet && (
        <a href={file} download={name}>
          last sheet{drawnKey !== contentKey && ', before the latest changes'}
        </a>
      )}
      {children}
      <Button type="primary" loading={isDrawing} onClick={() => void draw()}>
        Preview sheet
      </Button>
      {failure && (
        <span className="bg-field-error" role="alert">
          {failure}
        </span>
      )}
    </div>
  );
}
