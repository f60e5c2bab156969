export * from './assess';
export * from './equalise';
export * from './formulas';
export * from './network';
