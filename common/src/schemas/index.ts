export * from './fields';
export * from './parts';
export * from './specification-input';
