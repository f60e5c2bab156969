import { BASIS_WAYS } from './basis-ways';
import { BASIS_132, LINE_132 } from './line-132';
import { LINE_221 } from './line-221';
import type { StoryBasis, StoryDocument } from './steps';

export { BASIS_WAYS };
export type { StoryAct, StoryBasis, StoryBasisWay, StoryDocument, StorySave } from './steps';

export const DOCUMENTS: readonly StoryDocument[] = [...LINE_221, ...LINE_132];
export const BASES: readonly StoryBasis[] = [BASIS_132];
