import { createBoard, passive } from '../shared/boards.mjs';
import { dualChip, gridChip, padGrid, shieldCan } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg } from '../shared/svg.mjs';

const phoneOutlines = [
  'M-130 -60H60V-34H130V60H-40V44H-130Z',
  'M-130 -48a12 12 0 0 1 12 -12H118a12 12 0 0 1 12 12V8H70V60H-130Z',
  'M-130 -60H-50V-40H130V60H-130Z',
];
const phoneCuts = [
  [
    [95, -47, 76, 32],
    [-85, 52, 96, 22],
  ],
  [[100, 34, 66, 58]],
  [[40, -50, 186, 26]],
];

export function phoneBoard(random) {
  const kind = random.whole(0, 2);
  const board = createBoard({
    width: 260,
    height: 120,
    mask: random.pick(['dark-green', 'blue', 'green', 'black', 'blue']),
    random,
    outline: phoneOutlines[kind],
    thickness: 3,
  });
  for (const [x, y, width, height] of phoneCuts[kind]) board.reserve(x, y, width, height);
  if (random.chance(0.55)) board.put(shieldCan(70, 62), -85, 2);
  else board.put(gridChip(58, { label: ['SU 21', '1316'] }), -88, 2);
  board.put(gridChip(40, { label: ['VM 5', '13'] }), -18, 10);
  board.put(shieldCan(48, 30, { holes: false }), 40, 18);
  const pads = { width: 40, height: 24, face: padGrid({ columns: 5, rows: 3, pitch: 8, radius: 2.8 }) };
  board.scatter(2, () => pads, { margin: 6 });
  board.scatter(6, () => random.pick([gridChip(20), dualChip(18, 12, { leads: 5, reach: 4 }), gridChip(26)]), {
    gap: 2,
    margin: 8,
  });
  board.scatter(70, () => passive(random, 0.62), { gap: 1, margin: 6, tries: 5 });
  return board.finish();
}

/** Phone boards, cells removed, in a loose layer. */
export function phoneBoards() {
  const random = createRandom(77);
  const boards = Array.from({ length: 46 }, (_, index) => {
    const [column, row] = [index % 6, Math.floor(index / 6)];
    return lay(phoneBoard(random), {
      x: 190 + column * 246 + random.around(0, 40),
      y: 110 + row * 142 + random.around(0, 34),
      turn: random.around(0, 34) + random.pick([0, 0, 180, 90]),
      lean: random.between(0.86, 1),
      shade: random.around(-0.02, 0.09),
      lift: 'mid',
      scale: 1.02,
    });
  });
  const rule = lay(ruler({ lengthMm: 150, pixelsPerMm: 5 }), { x: 820, y: 1100, turn: 1.6, lift: 'high' });
  return { drawing: svg`${benchTop('paper')}${boards}${rule}`, view: 'bench', seed: 77 };
}
