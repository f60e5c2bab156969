export * from './assess';
export * from './classes';
export * from './factors';
export * from './formulas';
export * from './ice';
export * from './loads';
export * from './post';
export * from './v-string';
