import type { InsulatorUnit } from '@bellgap/common/api';
import { Button } from 'antd';
import { lazy, memo, Suspense, useState } from 'react';
import type { Answer } from '../../hooks/use-live-evaluation';
import type { RevisionAddress } from '../../queries/use-revision';

/** Fetched when it is first opened; the page does not wait for it. */
const WhatIfDrawer = lazy(async () => ({ default: (await import('./what-if-drawer')).WhatIfDrawer }));

interface Properties {
  address: RevisionAddress;
  answer: Answer;
  unit: InsulatorUnit | null;
}

export const WhatIfAction = memo(function WhatIfAction({ address, answer, unit }: Properties) {
  const [isOpen, setOpen] = useState(false);
  const [wasOpened, setOpened] = useState(false);
  return (
    <>
      <Button
        onClick={() => {
          setOpened(true);
          setOpen(true);
        }}
      >
        What if
      </Button>
      {wasOpened && (
        <Suspense>
          <WhatIfDrawer address={address} answer={answer} unit={unit} open={isOpen} onClose={() => setOpen(false)} />
        </Suspense>
      )}
    </>
  );
});
