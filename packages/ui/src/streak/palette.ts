import type { StreakTheme } from './streak-types.ts';

export interface StreakPalette {
  stone: string;
  stoneLine: string;
  stoneInk: string;
  stoneInk2: string;
  gold: string;
  goldHigh: string;
  goldDim: string;
  beadGhost: string;
  assay: string;
  notch: string;
  /** Outline of the whole stone; null where the page draws it. */
  outline: string | null;
  font: string;
}

const stone: StreakPalette = {
  stone: '#191E21',
  stoneLine: '#343D41',
  stoneInk: '#E7EBE8',
  stoneInk2: '#AAB4B4',
  gold: '#EDBB47',
  goldHigh: '#FFE3A0',
  goldDim: '#A08C58',
  beadGhost: '#8A7B4F',
  assay: '#8FCDF5',
  notch: '#E7EBE8',
  outline: null,
  font: 'IBM Plex Sans, sans-serif',
};

const palettes: Record<StreakTheme, StreakPalette> = {
  screen: {
    stone: 'var(--stone)',
    stoneLine: 'var(--stone-line)',
    stoneInk: 'var(--stone-ink)',
    stoneInk2: 'var(--stone-ink-2)',
    gold: 'var(--gold)',
    goldHigh: 'var(--gold-hi)',
    goldDim: 'var(--gold-dim)',
    beadGhost: 'var(--bead-ghost)',
    assay: 'var(--assay-on)',
    notch: 'var(--notch)',
    outline: null,
    font: 'IBM Plex Sans Variable, IBM Plex Sans, sans-serif',
  },
  mail: stone,
  print: {
    ...stone,
    stone: '#FFFFFF',
    stoneLine: '#DDDDDD',
    stoneInk: '#111111',
    stoneInk2: '#434C4E',
    gold: '#111111',
    goldHigh: '#111111',
    goldDim: '#666666',
    beadGhost: '#888888',
    assay: '#111111',
    notch: '#111111',
    outline: '#111111',
  },
};

/** The colours of a theme; on a list's common stone the notch can't show the page, so it takes the stone's ink. */
export function streakPalette(theme: StreakTheme, onCommonStone: boolean): StreakPalette {
  const palette = palettes[theme];
  return onCommonStone && theme === 'screen' ? { ...palette, notch: 'var(--notch-on-stone)' } : palette;
}
