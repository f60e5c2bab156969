import type { Block } from '../blocks';
import type { SheetContent } from '../content';
import { calculation } from './calculation';
import { cautions } from './cautions';
import { checkRecord } from './check-record';
import { clearances } from './clearances';
import { concessions } from './concessions';
import { mechanical } from './mechanical';
import { notAssessed } from './not-assessed';
import { overrides } from './overrides';
import { particulars } from './particulars';
import { remarks } from './remarks';
import { revisionHistory } from './revision-history';
import { ruleOfThumb } from './rule-of-thumb';
import { standingCautions } from './standing-cautions';
import { supplierProof } from './supplier-proof';
import { verification } from './verification';

/** What follows the first page, in its order. */
const SECTIONS: ((content: SheetContent) => Block[])[] = [
  concessions,
  clearances,
  mechanical,
  supplierProof,
  ruleOfThumb,
  checkRecord,
  remarks,
  calculation,
  cautions,
  overrides,
  notAssessed,
  particulars,
  standingCautions,
  revisionHistory,
  verification,
];

export const collectSections = (content: SheetContent): Block[] => SECTIONS.flatMap((section) => section(content));
