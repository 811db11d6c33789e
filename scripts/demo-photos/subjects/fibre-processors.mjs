import { bevel, layGrid } from '../shared/arrange.mjs';
import { mouldedBody, padGrid } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop } from '../shared/scene.mjs';
import { at, box, mark, rectanglePath, svg, times } from '../shared/svg.mjs';

function fibreProcessor(size, random, pinsUp) {
  const resin = random.pick(['resin-brown', 'resin-brown', 'resin-green']);
  const outline = svg`M${-size / 2} ${-size / 2}H${size * 0.42}L${size / 2} ${-size * 0.42}V${size / 2}H${-size / 2}Z`;
  const base = svg`<path d="${outline}" fill="url(#${resin})"/>${bevel(outline)}`;
  const small = times(
    18,
    (index) =>
      svg`<rect x="${(index % 2 ? 0.33 : -0.39) * size + random.between(0, size * 0.05)}" y="${size * (-0.38 + Math.floor(index / 2) * 0.088)}" width="${size * 0.045}" height="${size * 0.026}" fill="#c2b08d"/>`,
  );
  if (!pinsUp) {
    const die = random.chance(0.5)
      ? mouldedBody(size * 0.5, size * 0.46, { label: ['WN 31', '0231'], tall: 5 })
      : svg`${box(size * 0.54, size * 0.54, '#00000055', 'transform="translate(4 6)"')}<path d="${rectanglePath(size * 0.54, size * 0.54, size * 0.03)}" fill="url(#steel-bright)"/>${mark(0, 0, size * 0.055, 'LN 2400', '#6c7173')}${mark(0, size * 0.08, size * 0.045, '0419 B', '#6c7173')}`;
    return { outline, face: svg`${base}${small}${die}`, edge: '#4a3d25', thickness: 6 };
  }
  const pitch = (size * 0.92) / 22;
  const keep = (column, row, ring) => ring < 6 && !(column > 19 && row < 2);
  const shadows = at(
    2.5,
    4.5,
    padGrid({ columns: 23, rows: 23, pitch, radius: pitch * 0.28, fill: '#00000055', glint: '', keep }),
  );
  const pins = padGrid({ columns: 23, rows: 23, pitch, radius: pitch * 0.29, keep });
  const middle = times(
    12,
    (index) =>
      svg`<rect x="${size * (-0.16 + (index % 4) * 0.09)}" y="${size * (-0.12 + Math.floor(index / 4) * 0.1)}" width="${size * 0.035}" height="${size * 0.055}" fill="#b9a787"/>`,
  );
  return { outline, face: svg`${base}${shadows}${pins}${middle}`, edge: '#4a3d25', thickness: 6 };
}

/** Pinned processors on resin, tops and pins. */
export function fibrePinned() {
  const random = createRandom(15);
  const parts = layGrid(random, {
    columns: 7,
    rows: 5,
    left: 170,
    top: 120,
    pitch: 212,
    loose: 18,
    turn: 12,
    make: () => fibreProcessor(178, random, random.chance(0.45)),
  });
  return { drawing: svg`${benchTop('greyMat')}${parts}`, view: 'bench', seed: 15 };
}

function landProcessor(size, random, padsUp) {
  const outline = rectanglePath(size, size, 4);
  const base = svg`<path d="${outline}" fill="url(#mask-dark-green)"/>${bevel(outline)}`;
  if (padsUp) {
    const pads = padGrid({
      columns: 31,
      rows: 31,
      pitch: (size * 0.94) / 31,
      radius: size * 0.0105,
      fill: '#d3ab57',
      glint: '#f6df9d',
      keep: (column, row) => !(column > 9 && column < 21 && row > 9 && row < 21),
    });
    const middle = times(
      20,
      (index) =>
        svg`<rect x="${size * (-0.13 + (index % 5) * 0.056)}" y="${size * (-0.13 + Math.floor(index / 5) * 0.075)}" width="${size * 0.026}" height="${size * 0.045}" fill="${random.pick(['#b9a787', '#8f7f63', '#cfc3a4'])}"/>`,
    );
    return { outline, face: svg`${base}${pads}${middle}`, edge: '#7f8a5c', thickness: 4 };
  }
  const lid = rectanglePath(size * 0.76, size * 0.76, size * 0.06);
  const ears = svg`<rect x="${-size * 0.44}" y="${-size * 0.2}" width="${size * 0.88}" height="${size * 0.4}" rx="6" fill="url(#steel)"/>`;
  const lettering = svg`${mark(0, -size * 0.1, size * 0.062, 'CORVAL E4', '#5f6466')}${mark(0, 0, size * 0.052, '2.66 / 1066', '#6c7173')}${mark(0, size * 0.09, size * 0.052, 'Q 0842 F', '#6c7173')}`;
  const dots = times(
    6,
    (index) => svg`<circle cx="${size * (-0.42 + index * 0.03)}" cy="${size * 0.45}" r="2.4" fill="#d3ab57"/>`,
  );
  return {
    outline,
    face: svg`${base}${dots}${ears}<path d="${lid}" fill="#000" opacity=".3" transform="translate(3 5)"/><path d="${lid}" fill="url(#steel-bright)"/>${lettering}`,
    edge: '#7f8a5c',
    thickness: 5,
  };
}

/** Land-pad processors, lids and pads. */
export function fibreLand() {
  const random = createRandom(16);
  const parts = layGrid(random, {
    columns: 6,
    rows: 5,
    left: 210,
    top: 130,
    pitch: 234,
    loose: 16,
    turn: 9,
    make: () => landProcessor(196, random, random.chance(0.5)),
  });
  return { drawing: svg`${benchTop('cardboard')}${parts}`, view: 'bench', seed: 16, warmth: 0.012 };
}
