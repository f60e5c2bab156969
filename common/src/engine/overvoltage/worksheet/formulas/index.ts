export * from './representative';
export * from './withstand';
