import type { Distribution } from './distribution.ts';
import type { StreakGeometry } from './geometry.ts';
import type { StreakPalette } from './palette.ts';
import type { StreakAxis } from './streak-axis.ts';
import { coordinate as c } from './svg-text.ts';

const POINTS = 48;
const POINTS_PER_STOP = 3;
/** Below this height scratches would only be noise. */
export const LEAST_SCRATCHED_HEIGHT = 26;

export interface SmearInput {
  id: string;
  seed: number;
  distribution: Distribution;
  axis: StreakAxis;
  geometry: StreakGeometry;
  palette: StreakPalette;
  /** 1, or 0.42 once an assay is in. */
  strength: number;
}

interface Profile {
  /** Height of the smear at an amount of gold as a share of its mode's, 0 … 1. */
  relative: (goldG: number) => number;
  points: { x: number; share: number }[];
}

/** mulberry32: small, seeded and the same on every machine. */
export function seededRandom(seed: number): () => number {
  let state = seed | 0;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** Density as it falls on the drawn axis, per gram or per step of a log axis. */
function profileOf({ distribution, axis, geometry }: SmearInput): Profile {
  const { fromG, toG, logDensityAt } = distribution;
  const isLog = geometry.axis === 'log' && fromG > 0;
  const goldAtStep = (i: number) =>
    isLog ? fromG * (toG / fromG) ** (i / POINTS) : fromG + ((toG - fromG) * i) / POINTS;
  const drawn = (goldG: number) => logDensityAt(goldG) / (isLog ? 1 : goldG || 1);
  const golds = Array.from({ length: POINTS + 1 }, (_, i) => goldAtStep(i));
  const highest = Math.max(...golds.map(drawn)) || 1;
  const relative = (goldG: number) => Math.min(1, drawn(goldG) / highest);
  return { relative, points: golds.map((goldG) => ({ x: axis.x(goldG), share: relative(goldG) })) };
}

function body({ id, geometry, palette, strength }: SmearInput, { points }: Profile, isScratched: boolean): string {
  const { smearY, smearHeight } = geometry;
  const fromX = points[0]?.x ?? 0;
  const toX = points.at(-1)?.x ?? 0;
  const stops = points
    .filter((_, i) => i % POINTS_PER_STOP === 0)
    .map(({ x, share }) => {
      const offset = toX > fromX ? (x - fromX) / (toX - fromX) : 0;
      const opacity = strength * (0.06 + 0.94 * share);
      return `<stop offset="${c(offset, 4)}" stop-color="${palette.gold}" stop-opacity="${c(opacity, 3)}"/>`;
    })
    .join('');
  const edge = (side: 1 | -1) =>
    points.map(({ x, share }) => `${c(x)} ${c(smearY + (side * smearHeight * Math.sqrt(share)) / 2)}`);
  const outline = `M${[...edge(-1), ...edge(1).reverse()].join('L')}Z`;
  return (
    `<linearGradient id="${id}-smear" gradientUnits="userSpaceOnUse" x1="${c(fromX)}" x2="${c(toX)}" y1="0" y2="0">${stops}</linearGradient>` +
    `<path d="${outline}" fill="url(#${id}-smear)" opacity="${isScratched ? 0.62 : 0.95}"/>`
  );
}

/** Horizontal strokes along the smear, and a few of bare stone back through it. Texture only: density stays in height and opacity. */
function scratches(input: SmearInput, { relative, points }: Profile): string {
  const { axis, geometry, palette, strength, distribution } = input;
  const { smearY, smearHeight } = geometry;
  const random = seededRandom(input.seed);
  const spanPx = (points.at(-1)?.x ?? 0) - (points[0]?.x ?? 0);
  const span = Math.min(1.15, Math.max(0.3, spanPx / 420));
  const rows = Math.round(smearHeight / 1.5);
  const strokes = ['', '', ''];
  for (let row = 0; row < rows; row++) {
    const y = smearY - smearHeight / 2 + ((row + 0.5) * smearHeight) / rows;
    for (let k = 0; k < 13; k++) {
      const goldG = distribution.quantileAt(random());
      const halfHeight = (smearHeight / 2) * Math.sqrt(relative(goldG));
      if (Math.abs(y - smearY) > halfHeight * (0.86 + 0.2 * random())) continue;
      const length = (5 + random() * random() * 52) * span;
      const kind = Math.floor(random() * 3);
      strokes[kind] += `M${c(axis.x(goldG) - length / 2)} ${c(y + (random() - 0.5) * 0.7, 2)}h${c(length)}`;
    }
  }
  let back = '';
  for (let k = 0; k < Math.round(26 * span); k++) {
    const goldG = distribution.quantileAt(random());
    const y = smearY + (random() - 0.5) * smearHeight * 0.9;
    const length = (8 + random() * 50) * span;
    back += `M${c(axis.x(goldG) - length / 2)} ${c(y)}h${c(length)}`;
  }
  const looks: [string, number, number][] = [
    [palette.gold, 0.7, 0.42],
    [palette.gold, 0.95, 0.5],
    [palette.goldHigh, 0.7, 0.5],
  ];
  const drawn = looks.map(
    ([colour, width, opacity], i) =>
      `<path d="${strokes[i]}" stroke="${colour}" stroke-width="${width}" stroke-opacity="${c(opacity * strength, 3)}" fill="none"/>`,
  );
  return `<g class="streak-scratches">${drawn.join('')}<path d="${back}" stroke="${palette.stone}" stroke-width="0.8" stroke-opacity="0.55" fill="none"/></g>`;
}

/** The streak itself: height follows the square root of density, opacity follows density. */
export function smear(input: SmearInput): string {
  const profile = profileOf(input);
  const isScratched = input.geometry.height >= LEAST_SCRATCHED_HEIGHT;
  return body(input, profile, isScratched) + (isScratched ? scratches(input, profile) : '');
}
