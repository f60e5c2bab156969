import { inFours } from '@bellgap/common/api';
import { heading, paragraph, type Block } from '../blocks';
import type { SheetContent } from '../content';

/** How to find out whether a print is still good. */
export function verification({ issued }: SheetContent): Block[] {
  if (!issued) return [];
  return [
    heading(1, 'Verification'),
    paragraph(
      'A print says what was issued, not whether it is still in force. Look up the code, and compare number, revision and ' +
        'content code with this sheet: where one differs, the print is not what was issued.',
    ),
    {
      kind: 'pairs',
      labelShare: 0.3,
      rows: [
        { label: 'Verification code', value: inFours(issued.verificationCode), mono: true },
        { label: 'Look up at', value: issued.verificationUrl },
        { label: 'Content code', value: issued.contentCode, mono: true },
        { label: 'Last seal of the trail', value: issued.lastSeal ?? 'none yet', mono: issued.lastSeal !== null },
      ],
    },
  ];
}
