export { ChangeList } from './change-list';
export { changesText, trailValueWords, wholeValue } from './value-words';
