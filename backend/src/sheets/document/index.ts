export * from './content';
export * from './render-sheet';
export { MissingGlyphError } from './fonts/faces';
