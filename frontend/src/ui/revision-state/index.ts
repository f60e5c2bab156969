export { RevisionStateMark } from './state-mark';
