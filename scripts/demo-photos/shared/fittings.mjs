import { padGrid, raised } from './packages.mjs';
import { at, box, svg, times } from './svg.mjs';

/** An electrolytic can seen from above, its vent scored and its negative side printed. */
export function canCapacitor(radius, { sleeve = '#2b3138' } = {}) {
  const face = svg`<ellipse cx="${radius * 0.45}" cy="${radius * 0.7}" rx="${radius * 1.1}" ry="${radius}" fill="#000" opacity=".4"/><circle cy="${-radius * 0.1}" r="${radius}" fill="${sleeve}"/><circle cy="${-radius * 0.35}" r="${radius * 0.86}" fill="url(#steel-bright)"/><path d="M${-radius * 0.5} ${-radius * 0.85}L${radius * 0.5} ${radius * 0.15}M${radius * 0.5} ${-radius * 0.85}L${-radius * 0.5} ${radius * 0.15}" stroke="#7d8385" stroke-width="${radius * 0.1}"/>`;
  return { width: radius * 2.1, height: radius * 2.3, face };
}

/** A moulded power choke. */
export const choke = (size) => ({
  width: size,
  height: size,
  face: svg`${raised(size, size, '#6b6f70', { tall: 6, side: '#3b3e40', round: 3 })}<rect x="${-size * 0.3}" y="${-size * 0.3 - 3}" width="${size * 0.6}" height="${size * 0.6}" fill="#777b7c" rx="2"/>`,
});

/** A ring of copper wire on a core. */
export const toroid = (radius) => ({
  width: radius * 2,
  height: radius * 2,
  face: svg`<ellipse cx="4" cy="7" rx="${radius}" ry="${radius}" fill="#000" opacity=".4"/><circle r="${radius * 0.72}" fill="none" stroke="#8d7a2e" stroke-width="${radius * 0.5}"/>${times(
    26,
    (index) =>
      svg`<rect x="${-radius * 0.045}" y="${-radius}" width="${radius * 0.13}" height="${radius * 0.56}" rx="1" fill="#c4743a" stroke="#7d4219" stroke-width=".6" transform="rotate(${index * 13.85})"/>`,
  )}`,
});

/** A transformer: core, windings, yellow tape. */
export const transformer = (width, height) => ({
  width,
  height,
  face: svg`${raised(width, height, '#3a3835', { tall: 16, side: '#201f1d', round: 2 })}${at(0, -8, svg`${box(width * 0.66, height * 1.02, '#d8b23f')}<rect x="${-width * 0.33}" y="${-height * 0.2}" width="${width * 0.66}" height="2" fill="#b08e2b"/><rect x="${-width * 0.33}" y="${height * 0.2}" width="${width * 0.66}" height="2" fill="#b08e2b"/>`)}`,
});

/** A finned heat sink seen from above. */
export function heatSink(width, height, { fins = 8, fill = 'url(#steel)', dark = '#4d5355' } = {}) {
  const pitch = width / fins;
  const slots = times(
    fins - 1,
    (index) =>
      svg`<rect x="${-width / 2 + pitch * (index + 0.78)}" y="${-height / 2 - 5}" width="${pitch * 0.46}" height="${height}" fill="${dark}"/>`,
  );
  return { width, height, face: svg`${raised(width, height, fill, { tall: 12, side: '#5b6163' })}${slots}` };
}

/** A card or memory slot; `upright` turns it a quarter. */
export function slot(length, { fill = '#2a2d30', thick = 15, upright = false, latches = '' } = {}) {
  const face = svg`${raised(length, thick, fill, { tall: 7, side: '#121415' })}<rect x="${-length / 2 + 6}" y="-5.5" width="${length - 12}" height="4" fill="#08090a"/>${times(
    Math.floor((length - 16) / 5),
    (index) => svg`<rect x="${-length / 2 + 8 + index * 5}" y="-5" width="1.8" height="3" fill="#c29a47"/>`,
  )}${latches ? svg`<rect x="${-length / 2 - 8}" y="-9" width="12" height="${thick}" fill="${latches}"/><rect x="${length / 2 - 4}" y="-9" width="12" height="${thick}" fill="${latches}"/>` : ''}`;
  return upright
    ? { width: thick + 4, height: length + 8, face: svg`<g transform="rotate(90)">${face}</g>` }
    : { width: length + 8, height: thick + 4, face };
}

/** Rows of gold header pins in a plastic strip. */
export const header = (columns, rows, { pitch = 9, fill = '#1d1f20' } = {}) => ({
  width: columns * pitch,
  height: rows * pitch,
  face: svg`${raised(columns * pitch, rows * pitch, fill, { tall: 5 })}${at(0, -3, padGrid({ columns, rows, pitch, radius: pitch * 0.22, fill: '#c9a04c' }))}`,
});

/** A steel-clad port block as at the back of a main board; `openings` are heights of its mouths. */
export function portBlock(width, openings, { fill = 'url(#steel)' } = {}) {
  const height = openings.reduce((sum, opening) => sum + opening + 7, 7);
  let top = -height / 2 + 7;
  const mouths = openings.map((opening) => {
    const mouth = svg`<rect x="${-width / 2}" y="${top - 7}" width="${width * 0.34}" height="${opening}" fill="#17191a"/><rect x="${-width / 2 + 3}" y="${top - 7 + opening * 0.35}" width="${width * 0.24}" height="${opening * 0.22}" fill="#8d7438"/><rect x="${-width * 0.1}" y="${top - 5}" width="${width * 0.5}" height="1.4" fill="#6e7476"/>`;
    top += opening + 7;
    return mouth;
  });
  return { width, height, face: svg`${raised(width, height, fill, { tall: 14, side: '#656b6d', round: 2 })}${mouths}` };
}

/** An empty processor socket with its lever. */
export function processorSocket(size, { fill = '#ddd8ca', frame = false } = {}) {
  const holes = padGrid({
    columns: 20,
    rows: 20,
    pitch: size / 23,
    radius: size / 90,
    fill: frame ? '#c9a04c' : '#4c4a42',
    glint: '',
    keep: (column, row) => !(column > 6 && column < 13 && row > 6 && row < 13),
  });
  const body = frame
    ? svg`${raised(size * 1.12, size * 1.2, 'url(#steel-bright)', { tall: 6, side: '#6d7274', round: 3 })}${at(0, -3, box(size * 0.92, size * 0.92, '#26282a'))}`
    : svg`${raised(size, size * 1.04, fill, { tall: 7, side: '#8c8776', round: 2 })}`;
  const lever = svg`<path d="M${size * 0.56} ${-size * 0.5}V${size * 0.5}h${size * 0.08}" fill="none" stroke="#c4c9ca" stroke-width="4"/>`;
  return { width: size * 1.22, height: size * 1.24, face: svg`${body}${at(0, -4, holes)}${lever}` };
}

/** A coin-cell holder, its cell taken out. */
export const emptyCellHolder = (radius) => ({
  width: radius * 2,
  height: radius * 2,
  face: svg`<circle cx="3" cy="6" r="${radius}" fill="#000" opacity=".35"/><circle r="${radius}" fill="#202325"/><circle r="${radius * 0.8}" fill="#34383a"/><path d="M${-radius * 0.5} 0h${radius}" stroke="#b9bdbe" stroke-width="5"/><circle r="4" fill="#d8dbdb"/>`,
});

/** A crystal can. */
export const crystal = (length) => ({
  width: length,
  height: length * 0.42,
  face: svg`${raised(length, length * 0.42, 'url(#steel-bright)', { tall: 4, side: '#777d7f', round: length * 0.2 })}`,
});
