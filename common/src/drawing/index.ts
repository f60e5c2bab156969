export * from './figures';
export * from './path';
export * from './primitives';
export * from './string';
export * from './text-box';
export * from './unit';
