export * from './drawing-view';
