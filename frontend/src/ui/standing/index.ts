export { StandingMark, StandingShape, type ShownStanding } from './standing-mark';
