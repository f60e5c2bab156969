/**
 * What goes into an evaluation and what comes out: the contract between the engine, the API, the drawings and the
 * screens. Types only, plus the closed lists of choices; field names carry their units.
 */
export * from './answer';
export * from './choices';
export * from './context';
export * from './input';
