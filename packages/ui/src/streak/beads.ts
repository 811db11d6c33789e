import type { StreakGeometry } from './geometry.ts';
import type { StreakPalette } from './palette.ts';
import type { StreakAxis } from './streak-axis.ts';
import { coordinate as c } from './svg-text.ts';

/** Gap between beads as a share of their diameter. */
const GAP = 0.08;
/** Distance of the lowest bead from the stone's lower edge, px. */
const BASE = 7;
const LEAST_DIAMETER = 3;

export interface Bead {
  goldG: number;
  x: number;
  y: number;
}

/**
 * How many of the equally likely results hold at least the gold needed to break even.
 * With the quantiles (i − 0.5)/n this equals n times the chance, rounded.
 */
export function beadsAhead(beadsG: readonly number[], breakEvenG: number): number {
  return beadsG.filter((goldG) => goldG >= breakEvenG).length;
}

/** Beads that would lie past the end of the axis. */
export function beadsBeyond(beadsG: readonly number[], axisMaxG: number): number {
  return beadsG.filter((goldG) => goldG > axisMaxG).length;
}

/** Columns from left to right: beads closer than one pitch stack up, and columns never overlap. */
function stack(
  beadsG: readonly number[],
  axis: StreakAxis,
  diameter: number,
): { goldG: number; x: number; level: number }[] {
  const pitch = diameter * (1 + GAP);
  const placed: { goldG: number; x: number; level: number }[] = [];
  let lastX = -Infinity;
  for (let first = 0; first < beadsG.length;) {
    const firstX = axis.x(beadsG[first] ?? 0);
    let end = first + 1;
    while (end < beadsG.length && axis.x(beadsG[end] ?? 0) - firstX < pitch) end++;
    const middle = (firstX + axis.x(beadsG[end - 1] ?? 0)) / 2;
    const x = Math.max(middle, lastX + pitch);
    for (let i = first; i < end; i++) placed.push({ goldG: beadsG[i] ?? 0, x, level: i - first });
    lastX = x;
    first = end;
  }
  return placed;
}

/** Places the beads on the lower edge; they shrink as far as needed for the tallest column to stay below the smear. */
export function placeBeads(
  beadsG: readonly number[],
  axis: StreakAxis,
  geometry: StreakGeometry,
): { beads: Bead[]; diameter: number } {
  const base = geometry.height - BASE;
  const room = base - (geometry.smearY + geometry.smearHeight / 2);
  let diameter = geometry.bead;
  let placed = stack(beadsG, axis, diameter);
  const height = () => (Math.max(0, ...placed.map(({ level }) => level)) * (1 + GAP) + 1) * diameter;
  while (height() > room && diameter > LEAST_DIAMETER) {
    diameter *= 0.96;
    placed = stack(beadsG, axis, diameter);
  }
  const pitch = diameter * (1 + GAP);
  const beads = placed.map(({ goldG, x, level }) => ({ goldG, x, y: base - diameter / 2 - level * pitch }));
  return { beads, diameter };
}

interface BeadsInput {
  beadsG: readonly number[];
  axis: StreakAxis;
  geometry: StreakGeometry;
  palette: StreakPalette;
  breakEvenG: number | null;
  /** Once an assay is in, the beads are only where the estimate stood. */
  isGhost: boolean;
}

/** Equal beads, solid at or above break-even, open below: told by shape, never by colour alone. */
export function beads({ beadsG, axis, geometry, palette, breakEvenG, isGhost }: BeadsInput): string {
  const { beads: placed, diameter } = placeBeads(beadsG, axis, geometry);
  const radius = diameter / 2;
  const ring = Math.min(1.8, diameter / 6);
  const circle = ({ goldG, x, y }: Bead) => {
    const at = `cx="${c(x)}" cy="${c(y)}"`;
    if (isGhost) return `<circle ${at} r="${c(radius - 1)}" fill="none" stroke="${palette.beadGhost}"/>`;
    if (breakEvenG === null || goldG >= breakEvenG) return `<circle ${at} r="${c(radius)}" fill="${palette.gold}"/>`;
    return `<circle ${at} r="${c(radius - ring / 2)}" fill="none" stroke="${palette.goldDim}" stroke-width="${c(ring)}"/>`;
  };
  return `<g class="streak-beads">${placed.map(circle).join('')}</g>`;
}
