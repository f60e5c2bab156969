export { StoredWorksheet } from './stored-worksheet';
export { WorksheetPart } from './worksheet-part';
