import type { StreakGeometry } from './geometry.ts';
import type { StreakPalette } from './palette.ts';
import type { StreakAxis } from './streak-axis.ts';
import type { AssayMark, StreakOutline } from './streak-types.ts';
import { coordinate as c } from './svg-text.ts';

interface MarkInput {
  axis: StreakAxis;
  geometry: StreakGeometry;
  palette: StreakPalette;
}

/** Height from which a notch has a line down through the stone. */
const LEAST_LINED_HEIGHT = 40;

const inside = (x: number, halfWidth: number, width: number) => Math.min(Math.max(x, halfWidth), width - halfWidth);

/** The own bid: cut from the upper edge at its break-even content. Beyond the axis it rests against the end. */
export function notch(breakEvenG: number, isClosed: boolean, { axis, geometry, palette }: MarkInput): string {
  const { height, width, markTop } = geometry;
  const [wide, deep] = geometry.notch;
  const x = inside(axis.x(breakEvenG), wide / 2, width);
  // A cut starts above the edge so that no hairline of stone is left.
  const top = markTop === 0 ? -1 : markTop;
  const line =
    height >= LEAST_LINED_HEIGHT && !isClosed
      ? `<path d="M${c(x)} ${c(markTop + deep)}V${height - markTop * 2}" stroke="${palette.notch}" stroke-width="1.5" stroke-dasharray="1 4" stroke-linecap="round"/>`
      : '';
  return `${line}<path class="streak-notch" d="M${c(x - wide / 2)} ${top}L${c(x)} ${c(markTop + deep)}L${c(x + wide / 2)} ${top}Z" fill="${palette.notch}"/>`;
}

/** Another buyer's highest bid: an open chevron. */
export function chevron(breakEvenG: number, { axis, geometry, palette }: MarkInput): string {
  const [wide, deep] = geometry.chevron;
  const x = inside(axis.x(breakEvenG), wide / 2, geometry.width);
  const top = geometry.markTop;
  return `<path class="streak-lead" d="M${c(x - wide / 2)} ${top}L${c(x)} ${c(top + deep)}L${c(x + wide / 2)} ${top}" fill="none" stroke="${palette.notch}" stroke-width="1.75"/>`;
}

/** Dashed brackets where the estimate's p10 and p90 stood before. */
export function brackets(before: StreakOutline, { axis, geometry, palette }: MarkInput): string {
  const top = geometry.smearY - geometry.smearHeight / 2;
  const { p10, p90 } = before.goldG;
  const d = [p10, p90].map((goldG) => `M${c(axis.x(goldG))} ${c(top)}v${c(geometry.smearHeight)}`).join('');
  return `<path d="${d}" stroke="${palette.stoneInk2}" stroke-width="1.5" stroke-dasharray="2 2.5" fill="none"/>`;
}

/** Results past the end of a fixed axis: a chevron at the edge and how many. */
export function beyondMark(count: number, of: number, { geometry, palette }: MarkInput): string {
  const { width, smearY, smearHeight, height } = geometry;
  const isLarge = height >= 100;
  const y = isLarge ? smearY + smearHeight / 2 + 14 : smearY;
  const text = `<text x="${width - 20}" y="${y + 4.5}" text-anchor="end" font-family="${palette.font}" font-size="13" fill="${palette.stoneInk}">${count} of ${of} beyond</text>`;
  return `<path d="M${width - 14} ${y - 5}l5 5l-5 5" fill="none" stroke="${palette.stoneInk}" stroke-width="1.75"/>${isLarge ? text : ''}`;
}

function assayHead(by: AssayMark['by'], x: number, { geometry, palette }: MarkInput): string {
  const isLarge = geometry.height >= 100;
  const y = geometry.height - (isLarge ? 14 : geometry.height >= 40 ? 10 : 8);
  if (by === 'settled' || geometry.height < 26) return '';
  if (by === 'umpire') {
    return `<path d="M${c(x)} ${y - 8}l8 8l-8 8l-8 -8z" fill="${palette.assay}" stroke="${palette.stone}" stroke-width="1.5"/>`;
  }
  const look =
    by === 'seller'
      ? `r="${isLarge ? 7 : 5}" fill="${palette.stone}" stroke="${palette.assay}" stroke-width="2"`
      : `r="${isLarge ? 8 : 6}" fill="${palette.assay}" stroke="${palette.stone}" stroke-width="1.5"`;
  return `<circle cx="${c(x)}" cy="${y}" ${look}/>`;
}

/** A laboratory's tick from the lower edge, its uncertainty as a band. The stone halo keeps it apart from gold. */
export function assayTick(assay: AssayMark, input: MarkInput): string {
  const { axis, geometry, palette } = input;
  const { height } = geometry;
  const x = axis.x(assay.goldG);
  const top = height * (height >= 40 ? 0.24 : 0.3);
  const spread = assay.plusMinusG ?? 0;
  const from = axis.x(Math.max(0, assay.goldG - spread));
  const bandWidth = axis.x(assay.goldG + spread) - from;
  const halo = `<path d="M${c(x)} ${height}V${c(top)}" stroke="${palette.stone}" stroke-width="6"/>`;
  const band =
    bandWidth > 3
      ? `<rect x="${c(from)}" y="${c(top)}" width="${c(bandWidth)}" height="${c(height - top)}" fill="${palette.assay}" opacity="0.24"/>`
      : '';
  const tick = `<path d="M${c(x)} ${height}V${c(top)}" stroke="${palette.assay}" stroke-width="${height >= 40 ? 2.5 : 2}"/>`;
  return `<g class="streak-assay">${halo}${band}${tick}${assayHead(assay.by, x, input)}</g>`;
}

/** What the beads mean, on the stone's bare left side. */
export function legend(kind: 'beads' | 'bid', of: number, { geometry, palette }: MarkInput): string {
  const { height } = geometry;
  const said = `<g fill="${palette.stoneInk2}"><text x="16" y="28">Each bead: 1 result in ${of},</text><text x="16" y="45">all equally likely</text></g>`;
  const keys =
    `<circle cx="24" cy="${height - 50}" r="7" fill="${palette.gold}"/><text x="40" y="${height - 45.5}">You come out ahead</text>` +
    `<circle cx="24" cy="${height - 26}" r="6.2" fill="none" stroke="${palette.goldDim}" stroke-width="1.8"/><text x="40" y="${height - 21.5}">You come out behind</text>`;
  return `<g font-family="${palette.font}" font-size="13" fill="${palette.stoneInk}">${said}${kind === 'bid' ? keys : ''}</g>`;
}
