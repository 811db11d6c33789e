import type { StreakSize } from './streak-types.ts';

export interface StreakGeometry {
  width: number;
  height: number;
  smearY: number;
  smearHeight: number;
  /** Largest diameter of a bead in px; 0 draws none. */
  bead: number;
  /** Width and depth of the own bid's notch. */
  notch: [number, number];
  /** Width and depth of the other bidder's chevron. */
  chevron: [number, number];
  /** Distance of notch and chevron from the upper edge: rows of a list share one stone and have no edge to cut. */
  markTop: number;
  axis: 'linear' | 'log';
  /** Grid lines: about so many at round figures, or quarters of the axis. */
  gridLines: number | 'quarters' | 'none';
}

const geometries: Record<StreakSize, StreakGeometry> = {
  large: {
    width: 1140,
    height: 160,
    smearY: 36,
    smearHeight: 42,
    bead: 20,
    notch: [26, 17],
    chevron: [18, 12],
    markTop: 0,
    axis: 'linear',
    gridLines: 12,
  },
  phone: {
    width: 358,
    height: 172,
    smearY: 36,
    smearHeight: 38,
    bead: 12.4,
    notch: [26, 17],
    chevron: [18, 12],
    markTop: 0,
    axis: 'linear',
    gridLines: 4,
  },
  medium: {
    width: 264,
    height: 64,
    smearY: 32,
    smearHeight: 38.4,
    bead: 0,
    notch: [18, 12],
    chevron: [14, 9.5],
    markTop: 0,
    axis: 'linear',
    gridLines: 'quarters',
  },
  card: {
    width: 360,
    height: 72,
    smearY: 36,
    smearHeight: 42,
    bead: 0,
    notch: [18, 12],
    chevron: [14, 9.5],
    markTop: 0,
    axis: 'linear',
    gridLines: 'quarters',
  },
  row: {
    width: 200,
    height: 28,
    smearY: 14,
    smearHeight: 17,
    bead: 0,
    notch: [12, 8],
    chevron: [12, 8],
    markTop: 0,
    axis: 'linear',
    gridLines: 'none',
  },
  cell: {
    width: 560,
    height: 80,
    smearY: 40,
    smearHeight: 26,
    bead: 0,
    notch: [18, 13],
    chevron: [16, 11.5],
    markTop: 3,
    axis: 'log',
    gridLines: 8,
  },
  inline: {
    width: 72,
    height: 12,
    smearY: 6,
    smearHeight: 9,
    bead: 0,
    notch: [8, 5],
    chevron: [8, 5],
    markTop: 0,
    axis: 'linear',
    gridLines: 'none',
  },
};

/** The drawn measures of a size, in px; a page may give its own width, never a height. */
export function streakGeometry(size: StreakSize, width?: number): StreakGeometry {
  const geometry = geometries[size];
  return width === undefined ? geometry : { ...geometry, width };
}
