export { insulationLevelsFor, switchingBetweenPhases, type InsulationLevelRow } from './levels';
export { assessInsulationLevel, matchInsulationLevel, type LevelChoice, type LevelMatch } from './level-choice';
export { insulationLevelWorksheet, type WorksheetOptions } from './worksheet';
