/** Edition of the method: raised with every change that changes a figure, and stored with every evaluation. */
export const METHOD_EDITION = '2026.3';
