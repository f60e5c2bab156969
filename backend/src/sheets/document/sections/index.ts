import type { Block } from '../blocks';
import type { SheetContent } from '../content';
import { calculation } from './calculation';
import { cautions } from './cautions';
import { clearances } from './clearances';
import { mechanical } from './mechanical';
import { notAssessed } from './not-assessed';
import { overrides } from './overrides';
import { particulars } from './particulars';
import { revisionHistory } from './revision-history';
import { ruleOfThumb } from './rule-of-thumb';
import { standingCautions } from './standing-cautions';
import { supplierProof } from './supplier-proof';

/** What follows the first page, in its order. */
const SECTIONS: ((content: SheetContent) => Block[])[] = [
  clearances,
  mechanical,
  supplierProof,
  ruleOfThumb,
  calculation,
  cautions,
  overrides,
  notAssessed,
  particulars,
  standingCautions,
  revisionHistory,
];

export const collectSections = (content: SheetContent): Block[] => SECTIONS.flatMap((section) => section(content));
