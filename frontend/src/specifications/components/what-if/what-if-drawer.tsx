import type { InsulatorUnit } from '@bellgap/common/api';
import { Drawer } from 'antd';
import type { Answer } from '../../hooks/use-live-evaluation';
import type { RevisionAddress } from '../../queries/use-revision';
import { CasesPart } from './cases';
import { NotesPart } from './notes';
import { SweepPart } from './sweep-map';
import './what-if.css';

interface Properties {
  address: RevisionAddress;
  answer: Answer;
  unit: InsulatorUnit | null;
  open: boolean;
  onClose: () => void;
}

/** What would change if the site, the string or the unit were another; the draft and its sheet stay as they are. */
export function WhatIfDrawer({ address, answer, unit, open, onClose }: Properties) {
  return (
    <Drawer
      open={open}
      title="What if"
      size="min(880px, 100vw)"
      onClose={onClose}
      destroyOnHidden
      classNames={{ body: 'what-if' }}
      closable={{ 'aria-label': 'Close' }}
    >
      <p className="zone-note">Thought of only: the draft and its sheet stay as they are.</p>
      <CasesPart address={address} answer={answer} />
      <SweepPart answer={answer} unit={unit} />
      <NotesPart address={address} />
    </Drawer>
  );
}
