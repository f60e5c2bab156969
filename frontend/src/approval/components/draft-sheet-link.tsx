import { contract, type Revision } from '@bellgap/common/api';
import { Button } from 'antd';
import { useState } from 'react';
import { failureText } from '../../api/api-error';
import { addressOf, call } from '../../api/client';

/** The draft as PDF: the one that stands, or one that is drawn now. */
export function DraftSheetLink({ revision }: { revision: Revision }) {
  const { projectCode: code, number, label, lastSheet } = revision;
  const [drawn, setDrawn] = useState(lastSheet?.current ?? false);
  const [drawing, setDrawing] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const params = { code, number, label };
  if (drawn) {
    return (
      <Button href={addressOf(contract.sheetFile, { params })} download={`${number}-${label}.pdf`}>
        Draft as PDF
      </Button>
    );
  }
  const draw = async () => {
    setDrawing(true);
    setFailure(null);
    try {
      await call(contract.drawSheet, { params });
      setDrawn(true);
    } catch (error) {
      setFailure(failureText(error));
    } finally {
      setDrawing(false);
    }
  };
  return (
    <>
      <Button loading={drawing} onClick={() => void draw()}>
        Draw the draft as PDF
      </Button>
      {failure && (
        <span role="alert" className="approval-failure">
          {failure}
        </span>
      )}
    </>
  );
}
