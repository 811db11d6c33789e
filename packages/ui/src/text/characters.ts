/** Stands between a figure and its unit, so that a line never breaks there. */
export const NBSP = '\u00a0';
export const MINUS = '\u2212';
export const EN_DASH = '\u2013';
