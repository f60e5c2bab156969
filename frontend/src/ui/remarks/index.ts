export { RaisingContext, useRaising } from './raising';
export { RemarkButton } from './remark-button';
export { RemarksPanel } from './remarks-panel';
export { fieldWords, lineWords, tracePath } from './remark-words';
export type { RemarksAddress } from './use-remarks';
