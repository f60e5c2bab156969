export * from './answers';
export * from './contract';
export * from './endpoint';
export * from './errors';
export * from './method-answers';
export * from './roles';
export * from './states';
export type * from '../engine/model';
