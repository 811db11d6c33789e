import { at, rectanglePath, svg, times } from './svg.mjs';

const edges = {
  green: '#7a8f5a',
  'dark-green': '#6b8260',
  lime: '#8aa05c',
  blue: '#5c7c80',
  black: '#4a4a3c',
  red: '#94604a',
  brown: '#7d5f34',
};
const copper = {
  green: '#52a97c',
  'dark-green': '#3f8a6b',
  lime: '#7db56c',
  blue: '#4f94b8',
  black: '#5d6165',
  red: '#c06058',
  brown: '#c9a871',
};

/**
 * A bare board that remembers what stands on it, so that nothing overlaps.
 * @param {{ width: number, height: number, mask?: keyof typeof edges, random: object, outline?: string, thickness?: number, silk?: string }} plan
 */
export function createBoard({ width, height, mask = 'green', random, outline, thickness = 5, silk = '#e9ece6' }) {
  const shape = outline ?? rectanglePath(width, height);
  const taken = [];
  const under = [traces({ width, height, random, colour: copper[mask] })];
  const over = [];
  const free = (x, y, w, h, gap) =>
    taken.every(
      (spot) => Math.abs(spot.x - x) * 2 >= spot.w + w + gap * 2 || Math.abs(spot.y - y) * 2 >= spot.h + h + gap * 2,
    );
  const board = {
    /** Keeps an area free of parts. */
    reserve: (x, y, w, h) => taken.push({ x, y, w, h }),
    /** Fixes a part at a place. */
    put(part, x, y, turn = 0) {
      const quarter = Math.abs(turn) % 180 === 90;
      const [w, h] = quarter ? [part.height, part.width] : [part.width, part.height];
      taken.push({ x, y, w, h });
      over.push({ y, drawing: at(x, y, part.face, turn) });
      under.push(
        svg`<rect x="${x - w / 2 - 3}" y="${y - h / 2 - 3}" width="${w + 6}" height="${h + 6}" fill="none" stroke="${silk}" stroke-width="1" opacity=".5"/>`,
      );
    },
    /** Drops up to `count` parts made by `make()` wherever there is room. */
    scatter(count, make, { gap = 4, margin = 14, tries = 12 } = {}) {
      for (let index = 0; index < count; index += 1) {
        const part = make();
        const turn = random.chance(0.4) && !part.fixed ? 90 : 0;
        const [w, h] = turn ? [part.height, part.width] : [part.width, part.height];
        for (let attempt = 0; attempt < tries; attempt += 1) {
          const x = random.around(0, width / 2 - margin - w / 2);
          const y = random.around(0, height / 2 - margin - h / 2);
          if (!free(x, y, w, h, gap)) continue;
          taken.push({ x, y, w, h });
          over.push({ y, drawing: at(x, y, part.face, turn) });
          break;
        }
      }
    },
    /** Draws something flat, under the parts. */
    print: (drawing) => under.push(drawing),
    /** The finished board, as a part to lay down. */
    finish() {
      const clip = `board-${(nextClip += 1)}`;
      const standing = over.toSorted((a, b) => a.y - b.y).map((item) => item.drawing);
      const face = svg`<clipPath id="${clip}"><path d="${shape}"/></clipPath><path d="${shape}" fill="url(#mask-${mask})"/><g clip-path="url(#${clip})">${under}<path d="${shape}" fill="none" stroke="#fff" stroke-opacity=".22" stroke-width="2.4"/></g>${standing}`;
      return { width, height, outline: shape, face, edge: edges[mask], thickness };
    },
  };
  return board;
}

let nextClip = 0;

/** Bundles of parallel copper lines with 45° bends, and the vias between layers. */
function traces({ width, height, random, colour }) {
  const bundles = times(Math.round((width * height) / 5200), () => {
    const [x, y] = [random.around(0, width / 2), random.around(0, height / 2)];
    const [run, bend, rise] = [
      random.between(14, 80),
      random.between(6, 26) * random.pick([-1, 1]),
      random.between(0, 60),
    ];
    const lines = random.whole(1, 5);
    const upright = random.chance(0.4) ? 'rotate(90)' : '';
    return svg`<g transform="translate(${x} ${y}) ${upright}">${times(lines, (line) => svg`<path d="M0 ${line * 4}h${run + line * 1.6}l${Math.abs(bend)} ${bend}v${bend > 0 ? rise : -rise}"/>`)}</g>`;
  });
  const vias = times(
    Math.round((width * height) / 2600),
    () => svg`<circle cx="${random.around(0, width / 2)}" cy="${random.around(0, height / 2)}" r="1.5"/>`,
  );
  return svg`<g fill="none" stroke="${colour}" stroke-opacity=".38" stroke-width="1.3">${bundles}</g><g fill="${colour}" stroke="#000" stroke-opacity=".35" stroke-width=".6">${vias}</g>`;
}

const passiveBodies = ['#b59a70', '#c8b48c', '#8a7a60', '#1f2122', '#1f2122', '#d6cdb8'];

/** One of the many two-ended small parts. */
export function passive(random, scale = 1) {
  const [width, height] = [9 * scale, 4.6 * scale];
  const face = svg`<rect x="${-width / 2 + 0.8}" y="${-height / 2 + 1.6}" width="${width}" height="${height}" fill="#000" opacity=".35"/><rect x="${-width / 2}" y="${-height / 2}" width="${width}" height="${height}" fill="#cfd2d0"/><rect x="${-width * 0.28}" y="${-height / 2}" width="${width * 0.56}" height="${height}" fill="${random.pick(passiveBodies)}"/>`;
  return { width: width + 1, height: height + 1, face };
}

/** A plated screw hole. */
export const screwHole = (radius, ring = '#c7a860') =>
  svg`<circle r="${radius * 1.7}" fill="${ring}"/><circle r="${radius}" fill="#33373a"/><circle cx="-.8" cy="-1" r="${radius}" fill="#1b1d1f"/>`;

/** A row of gold contacts along an edge, `width` wide and centred, each `tall` high. */
export function edgeContacts({ width, tall, pitch, gaps = [], random }) {
  const count = Math.floor(width / pitch);
  return times(count, (index) => {
    const share = index / count;
    if (gaps.some(([from, to]) => share > from && share < to)) return '';
    const gold = random.chance(0.12) ? 'gold-bright' : random.chance(0.12) ? 'gold-dull' : 'gold';
    return svg`<rect x="${-width / 2 + (index + 0.16) * pitch}" y="${-tall / 2}" width="${pitch * 0.68}" height="${tall}" rx="${Math.min(1.5, pitch * 0.16)}" fill="url(#${gold})"/>`;
  });
}
