export { MovesBar } from './moves-bar';
