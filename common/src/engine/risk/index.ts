export * from './flashover-risk';
export * from './formulas';
export * from './model';
