/** What the server would answer, for tests of the page: the page itself has no engine. */
export { insulationLevelsFor, insulationLevelWorksheet } from '../engine';
export { aWorksheet } from '../engine/testing/worksheets';
