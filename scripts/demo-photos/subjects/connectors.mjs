import { padGrid } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, box, rectanglePath, svg, times } from '../shared/svg.mjs';

const shells = [
  { fill: '#d9d4c3', side: '#9b9685', gold: '#d9b158' },
  { fill: '#26292b', side: '#0f1011', gold: '#d9b158' },
  { fill: '#2d5f86', side: '#18384f', gold: '#e0ba62' },
  { fill: '#8f3a2b', side: '#54201a', gold: '#d9b158' },
];

function blockConnector(random) {
  const { fill, side, gold } = random.pick(shells);
  const [columns, rows] = [random.whole(12, 32), random.whole(2, 4)];
  const [width, height] = [columns * 9 + 34, rows * 11 + 14];
  const outline = rectanglePath(width, height, 3);
  const holes = padGrid({ columns, rows, pitch: 9.4, radius: 3, fill: gold });
  const tails = times(
    columns,
    (index) =>
      svg`<rect x="${-width / 2 + 19 + index * 9}" y="${height / 2 - 2}" width="3.4" height="${random.between(12, 17)}" fill="url(#gold)"/>`,
  );
  return {
    outline,
    face: svg`${tails}<path d="${outline}" fill="${fill}"/>${box(width - 14, height - 10, side)}${holes}`,
    edge: side,
    thickness: 12,
  };
}

function shellConnector(random) {
  const columns = random.pick([8, 13, 19]);
  const width = columns * 12 + 30;
  const outline = svg`M${-width / 2 - 26} -32H${width / 2 + 26}V32H${-width / 2 - 26}Z`;
  const mouth = svg`<path d="M${-width / 2} -22H${width / 2}L${width / 2 - 10} 22H${10 - width / 2}Z" fill="url(#steel-bright)" stroke="#767c7e" stroke-width="2"/><path d="M${8 - width / 2} -15H${width / 2 - 8}L${width / 2 - 15} 15H${15 - width / 2}Z" fill="#1d2022"/>`;
  const pins = svg`${at(0, -6, padGrid({ columns, rows: 1, pitch: 11, radius: 3.4, fill: '#e2bc65' }))}${at(0, 7, padGrid({ columns: columns - 1, rows: 1, pitch: 11, radius: 3.4, fill: '#e2bc65' }))}`;
  const ears = [-1, 1].map((end) => svg`<circle cx="${end * (width / 2 + 13)}" r="7" fill="#2b2e30"/>`);
  return {
    outline,
    face: svg`<path d="${outline}" fill="url(#steel)"/>${ears}${mouth}${pins}`,
    edge: '#6c7274',
    thickness: 10,
  };
}

const slotConnector = (random) => {
  const width = random.between(260, 420);
  const fill = random.pick(['#e2ddcd', '#26292b', '#5c3c78', '#8a5a2c']);
  const outline = rectanglePath(width, 34, 3);
  const contacts = times(
    Math.floor((width - 24) / 6),
    (index) => svg`<rect x="${-width / 2 + 13 + index * 6}" y="-7" width="3" height="14" fill="url(#gold)"/>`,
  );
  return {
    outline,
    face: svg`<path d="${outline}" fill="${fill}"/>${box(width - 18, 15, '#0d0e0f')}${contacts}${box(width - 18, 3, '#050505')}`,
    edge: '#3a3733',
    thickness: 12,
  };
};

/** Connectors, whole: slots, blocks and shells. */
export function wholeConnectors() {
  const random = createRandom(102);
  const parts = times(120, (index) => {
    const make = random.pick([blockConnector, blockConnector, shellConnector, slotConnector]);
    const depth = index / 120;
    return lay(make(random), {
      x: 800 + random.bell() * 1000,
      y: 590 + random.bell() * 760,
      turn: random.between(0, 360),
      lean: random.between(0.75, 1),
      shade: -0.3 * (1 - depth) + random.around(0, 0.08),
      lift: 'mid',
    });
  });
  return { drawing: svg`${benchTop('paleWood')}${parts}`, view: 'bench', seed: 102, warmth: 0.01 };
}
