export { Figure, type FigureProperties } from './figure';
export { formatFull, formatNumber, type NumberFormat } from './format-number';
