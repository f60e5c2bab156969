export * from './evaluate';
export * from './input-faults';
export * from './method-edition';
export * from './model';
export * from './overvoltage';
export * from './sources';
export * from './standards';
