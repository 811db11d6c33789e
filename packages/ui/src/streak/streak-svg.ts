import { beads, beadsBeyond } from './beads.ts';
import { distributionOf } from './distribution.ts';
import { streakGeometry, type StreakGeometry } from './geometry.ts';
import { assayTick, beyondMark, brackets, chevron, legend, notch } from './marks.ts';
import { streakPalette, type StreakPalette } from './palette.ts';
import { smear } from './smear.ts';
import { gradeAxis, linearAxis, streakAxisMaxG, type StreakAxis } from './streak-axis.ts';
import { outlineOf, type StreakInput, type StreakOutline } from './streak-types.ts';
import { coordinate as c, escapeSvg } from './svg-text.ts';

/** Faded once a laboratory has spoken: the estimate is then only what was expected. */
const ASSAYED_STRENGTH = 0.42;
/** Domain of a stone that has no estimate yet; it only places the grid. */
const BARE_AXIS_G = 100;

interface Drawing {
  input: StreakInput;
  geometry: StreakGeometry;
  palette: StreakPalette;
  axis: StreakAxis;
  axisMaxG: number;
}

function prepare(input: StreakInput): Drawing {
  const geometry = streakGeometry(input.size, input.width);
  const isList = geometry.axis === 'log';
  const own = input.estimate ? streakAxisMaxG(input.estimate) : BARE_AXIS_G;
  const before = input.before ? streakAxisMaxG(input.before) : 0;
  const axisMaxG = input.axisMaxG ?? Math.max(own, before);
  const axis = isList ? gradeAxis(geometry, input.estimate?.massG ?? 1) : linearAxis(geometry, axisMaxG);
  return { input, geometry, axis, axisMaxG, palette: streakPalette(input.theme, isList) };
}

/** A lot's scratches are its own on every page: the seed comes from the estimate, to the digits all machines agree on. */
function seedOf({ massG, goldG }: StreakOutline): number {
  let hash = 2166136261;
  const text = [massG, goldG.p10, goldG.p50].map((value) => value.toPrecision(6)).join(' ');
  for (const character of text) hash = Math.imul(hash ^ (character.codePointAt(0) ?? 0), 16777619);
  return hash;
}

/** Grain of the stone, on screens only: printers and mail programs draw filters badly or not at all. */
function grain({ input, geometry }: Drawing): string {
  const isGrained = input.theme === 'screen' && (input.size === 'large' || input.size === 'phone');
  if (!isGrained) return '';
  return (
    `<filter id="${input.id}-grain" x="0" y="0" width="100%" height="100%"><feTurbulence type="fractalNoise" baseFrequency="0.035 0.4" numOctaves="4" seed="4"/><feColorMatrix values="0 0 0 0 .75 0 0 0 0 .82 0 0 0 0 .85 0 0 0 .42 -.2"/></filter>` +
    `<rect class="streak-texture" width="${geometry.width}" height="${geometry.height}" filter="url(#${input.id}-grain)" opacity="0.38"/>`
  );
}

function stone(drawing: Drawing): string {
  const { input, geometry, palette, axis } = drawing;
  const { width, height } = geometry;
  const grid = axis.grid.map((x) => `M${c(x)} 0V${height}`).join('');
  const lines = grid ? `<path d="${grid}" stroke="${palette.stoneLine}"/>` : '';
  const base = `<rect width="${width}" height="${height}" fill="${palette.stone}"/>${grain(drawing)}${lines}`;
  if (!input.estimate) {
    const label = `<text x="${c(width / 2)}" y="${c(height / 2 + 4.5)}" text-anchor="middle" font-family="${palette.font}" font-size="13" fill="${palette.stoneInk2}">Not yet estimated</text>`;
    return height >= 26 ? base + label : base;
  }
  const strength = input.assays?.length ? ASSAYED_STRENGTH : 1;
  const distribution = distributionOf(outlineOf(input.estimate));
  const seed = seedOf(outlineOf(input.estimate));
  return base + smear({ id: input.id, seed, distribution, axis, geometry, palette, strength });
}

function marks(drawing: Drawing): string {
  const { input, geometry, palette, axis, axisMaxG } = drawing;
  const { estimate, before, assays = [] } = input;
  const breakEvenG = input.breakEvenG ?? null;
  const parts: string[] = [];
  const { legend: explained = 'none' } = input;
  const beadsG = estimate && 'beadsG' in estimate ? estimate.beadsG : [];
  if (beadsG.length > 0 && explained !== 'none') parts.push(legend(explained, beadsG.length, drawing));
  if (before) parts.push(brackets(outlineOf(before), drawing));
  if (geometry.bead > 0 && beadsG.length > 0) {
    const shown = beadsG.filter((goldG) => goldG <= axisMaxG);
    parts.push(beads({ beadsG: shown, axis, geometry, palette, breakEvenG, isGhost: assays.length > 0 }));
  }
  const beyond = geometry.axis === 'linear' ? beadsBeyond(beadsG, axisMaxG) : 0;
  if (beyond > 0) parts.push(beyondMark(beyond, beadsG.length, drawing));
  if (breakEvenG !== null) parts.push(notch(breakEvenG, input.closed ?? false, drawing));
  if (input.leadBreakEvenG != null) parts.push(chevron(input.leadBreakEvenG, drawing));
  parts.push(...assays.map((assay) => assayTick(assay, drawing)));
  return parts.join('');
}

/**
 * The drawing in two layers, for a page that redraws the marks on each keystroke and keeps the stone.
 * Both belong into an `svg` with the given view box.
 */
export function streakLayers(input: StreakInput): { stone: string; marks: string; width: number; height: number } {
  const drawing = prepare(input);
  const { width, height } = drawing.geometry;
  const clip = `${input.id}-edge`;
  const radius = drawing.geometry.axis === 'log' ? 0 : height < 20 ? 2 : 3;
  const defs = `<clipPath id="${clip}"><rect width="${width}" height="${height}" rx="${radius}"/></clipPath>`;
  return {
    stone: `${defs}<g clip-path="url(#${clip})">${stone(drawing)}</g>`,
    marks: `<g clip-path="url(#${clip})">${marks(drawing)}</g>`,
    width,
    height,
  };
}

/**
 * An estimate as a mark on the touchstone: one pure function from figures to an SVG string, the same for screen, mail and paper.
 * The same input gives the same string on every machine. Attributes only, so it stands under a strict content policy.
 */
export function streakSvg(input: StreakInput): string {
  const { stone: lower, marks: upper, width, height } = streakLayers(input);
  const { outline } = streakPalette(input.theme, false);
  const frame = outline
    ? `<rect x="0.5" y="0.5" width="${width - 1}" height="${height - 1}" fill="none" stroke="${outline}"/>`
    : '';
  const isNamed = input.title !== undefined;
  const names = isNamed
    ? `<title id="${input.id}-t">${escapeSvg(input.title ?? '')}</title><desc id="${input.id}-d">${escapeSvg(input.description ?? '')}</desc>`
    : '';
  const role = isNamed
    ? `role="img" aria-labelledby="${input.id}-t" aria-describedby="${input.id}-d"`
    : 'aria-hidden="true"';
  const isList = input.size === 'cell';
  const cls = isList ? 'streak-cell-svg' : 'streak-svg streak-fixed';
  const stretch = isList ? ' preserveAspectRatio="none"' : '';
  return `<svg xmlns="http://www.w3.org/2000/svg" class="${cls}" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}"${stretch} ${role}>${names}${lower}${upper}${frame}</svg>`;
}
