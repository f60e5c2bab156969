export * from './distance';
export * from './dry-arc';
export * from './gap-factors';
export * from './strength';
