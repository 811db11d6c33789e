import { bevel, layGrid } from '../shared/arrange.mjs';
import { padGrid } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, mark, rectanglePath, svg } from '../shared/svg.mjs';

const ceramics = [
  { body: 'ceramic-violet', ink: '#d8cfd4', lid: 0.5, pins: 15, rings: 4, name: ['PX 4160', '9318 H'] },
  { body: 'ceramic-grey', ink: '#ded8cb', lid: 0.44, pins: 17, rings: 3, name: ['DORN 75', '9447 A'] },
  { body: 'ceramic-pale', ink: '#5a5444', lid: 0.56, pins: 13, rings: 2, name: ['PX 2075', '8902 C'] },
];

function ceramicProcessor(size, kind, pinsUp) {
  const outline = rectanglePath(size, size, size * 0.03);
  const base = svg`<path d="${outline}" fill="url(#${kind.body})"/>${bevel(outline)}`;
  const plate = (width) =>
    svg`<path d="${rectanglePath(width + 6, width + 6, width * 0.08)}" fill="#000" opacity=".3"/><path d="${rectanglePath(width, width, width * 0.08)}" fill="url(#gold-lid)"/><path d="${rectanglePath(width * 0.88, width * 0.88, width * 0.06)}" fill="none" stroke="#fff3cc" stroke-opacity=".55" stroke-width="2"/>`;
  const pitch = (size * 0.9) / (kind.pins - 1);
  const pins = padGrid({
    columns: kind.pins,
    rows: kind.pins,
    pitch,
    radius: pitch * 0.3,
    fill: '#e3bd66',
    keep: (column, row, ring) => ring < kind.rings && column + row > 0,
  });
  const shadows = at(
    3,
    6,
    padGrid({
      columns: kind.pins,
      rows: kind.pins,
      pitch,
      radius: pitch * 0.26,
      fill: '#00000066',
      glint: '',
      keep: (column, row, ring) => ring < kind.rings && column + row > 0,
    }),
  );
  const top = svg`${plate(size * kind.lid)}<path d="M${-size * 0.46} ${-size * 0.46}h${size * 0.09}l${-size * 0.09} ${size * 0.09}Z" fill="#d9b058"/>${mark(0, -size * 0.34, size * 0.075, kind.name[0], kind.ink)}${mark(0, size * 0.4, size * 0.062, kind.name[1], kind.ink)}`;
  const under = svg`${shadows}${pins}${plate(size * (0.9 - kind.rings * 0.13))}`;
  return { outline, face: svg`${base}${pinsUp ? under : top}`, edge: '#3c3732', thickness: 9 };
}

/** Ceramic processors, lids and pins in turn. */
export function ceramicProcessors() {
  const random = createRandom(8);
  const parts = layGrid(random, {
    columns: 6,
    rows: 4,
    left: 230,
    top: 165,
    pitch: 232,
    loose: 12,
    turn: 6,
    make: (index) => ceramicProcessor(196, ceramics[(index * 2 + Math.floor(index / 5)) % 3], random.chance(0.4)),
  });
  const rule = lay(ruler({ lengthMm: 200, pixelsPerMm: 4.4, steel: true }), { x: 760, y: 1092, turn: -1 });
  return { drawing: svg`${benchTop('blueMat')}${parts}${rule}`, view: 'bench', seed: 8 };
}
