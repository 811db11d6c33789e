import { createBoard, edgeContacts, passive, screwHole } from '../shared/boards.mjs';
import { canCapacitor, choke, crystal, header, heatSink, toroid, transformer } from '../shared/fittings.mjs';
import { barLabel, dualChip, gridChip, padGrid, quadChip, shieldCan } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

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

function phoneBoard(random) {
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

function driveBoard(random) {
  const [width, height] = [330, 220];
  const outline = random.pick([
    'M-165 -110H165V40L110 70V110H-60L-100 60H-165Z',
    'M-165 -110H165V110H-20C-20 30 -90 10 -165 20Z',
  ]);
  const board = createBoard({
    width,
    height,
    mask: random.pick(['green', 'blue', 'dark-green', 'green']),
    random,
    outline,
  });
  for (const [x, y, w, h] of [
    [-120, 85, 110, 70],
    [145, 92, 60, 50],
    [-70, 92, 90, 60],
  ])
    board.reserve(x, y, w, h);
  board.put(
    {
      width: 110,
      height: 30,
      face: svg`<rect x="-52" y="-10" width="110" height="30" opacity=".4"/><rect x="-55" y="-15" width="110" height="30" fill="#1c1e20"/><rect x="-48" y="-12" width="56" height="8" fill="#050606"/>${at(-20, -8, edgeContacts({ width: 54, tall: 6, pitch: 5, random }))}${at(36, -8, edgeContacts({ width: 34, tall: 6, pitch: 5, random }))}`,
    },
    60,
    -88,
  );
  board.put(quadChip(66, { label: ['MD 40', '0812'], leads: 26 }), 20, -10);
  board.put(dualChip(60, 26, { label: ['VM 3', '07'], leads: 12 }), -100, -40);
  board.put(gridChip(36, { label: ['SP 6', '08'] }), 110, 10);
  board.print(at(-60, 30, padGrid({ columns: 9, rows: 2, pitch: 9, radius: 3 })));
  board.reserve(-60, 30, 84, 22);
  for (const [x, y] of [
    [-145, -90],
    [145, -40],
    [-145, -10],
    [60, 80],
  ])
    board.print(at(x, y, screwHole(7)));
  board.scatter(9, () => random.pick([dualChip(24, 16, { leads: 5 }), crystal(24), choke(20)]));
  board.scatter(80, () => passive(random, 0.8), { gap: 1.2, tries: 5 });
  const part = board.finish();
  return random.chance(0.3) ? { ...part, face: svg`${part.face}${at(-100, -40, barLabel(70, 40, random), 4)}` } : part;
}

/** Hard-drive boards, some face down in the pile. */
export function hardDriveBoards() {
  const random = createRandom(78);
  const boards = Array.from({ length: 34 }, (_, index) =>
    lay(driveBoard(random), {
      x: 180 + (index % 6) * 256 + random.around(0, 70),
      y: 130 + Math.floor(index / 6) * 186 + random.around(0, 50),
      turn: random.between(0, 360),
      lean: random.between(0.85, 1),
      shade: -0.16 + (index / 34) * 0.2 + random.around(0, 0.05),
      lift: 'mid',
    }),
  );
  return { drawing: svg`${benchTop('blueMat')}${boards}`, view: 'bench', seed: 78 };
}

function playerBoard(random) {
  const [width, height] = [random.between(330, 430), random.between(220, 280)];
  const board = createBoard({ width, height, mask: random.pick(['green', 'lime', 'green', 'brown']), random });
  board.put(quadChip(72, { label: ['CD 905', '0419'], leads: 26 }), -30, -10);
  board.put(quadChip(44, { label: ['SV 12', '0420'], leads: 16 }), 80, 20);
  board.put(
    {
      width: 90,
      height: 22,
      face: svg`<rect x="-45" y="-11" width="90" height="22" fill="#e7e2d2"/><rect x="-40" y="-4" width="80" height="5" fill="#5e594b"/>`,
    },
    -width / 4,
    height / 2 - 20,
  );
  board.put(header(8, 1, { fill: '#e7e2d2' }), width / 4, -height / 2 + 18);
  board.scatter(8, () =>
    canCapacitor(random.between(9, 14), { sleeve: random.pick(['#20242a', '#2d3f6b', '#5a2b26']) }),
  );
  board.scatter(8, () => random.pick([dualChip(40, 20, { leads: 8, label: ['BA 6', '04'] }), crystal(26)]));
  board.scatter(90, () => passive(random), { gap: 1.5, tries: 5 });
  board.print(at(-width / 2 + 18, -height / 2 + 18, screwHole(7, '#b9bcb8')));
  return board.finish();
}

/** Boards out of optical drives and players. */
export function playerBoards() {
  const random = createRandom(79);
  const boards = Array.from({ length: 22 }, (_, index) =>
    lay(playerBoard(random), {
      x: 210 + (index % 5) * 300 + random.around(0, 50),
      y: 150 + Math.floor(index / 5) * 226 + random.around(0, 40),
      turn: random.around(0, 26) + random.pick([0, 90, 180]),
      shade: random.around(-0.04, 0.07),
      lift: 'mid',
    }),
  );
  return { drawing: svg`${benchTop('paleWood')}${boards}`, view: 'bench', seed: 79, warmth: 0.01 };
}

function powerBoard(random) {
  const [width, height] = [540, 380];
  const board = createBoard({ width, height, mask: 'brown', random, silk: '#6d4c22' });
  board.put(transformer(120, 100), -20, -40);
  board.put(transformer(64, 60), 150, -110);
  board.put(heatSink(46, 200, { fins: 3 }), -140, 0);
  board.put(heatSink(46, 170, { fins: 3 }), 100, 60);
  for (const y of [-110, -20]) board.put(canCapacitor(40, { sleeve: '#1f3a5f' }), -210, y);
  board.put(toroid(36), 200, 60);
  board.put(toroid(28), -200, 100);
  board.scatter(14, () =>
    canCapacitor(random.between(12, 20), { sleeve: random.pick(['#20242a', '#2e5a3c', '#5a2b26']) }),
  );
  board.scatter(24, () =>
    random.pick([
      dualChip(38, 20, { leads: 4 }),
      choke(26),
      {
        width: 34,
        height: 12,
        face: svg`<rect x="-17" y="-1" width="34" height="2" fill="#b9bdbe"/><rect x="-10" y="-5" width="20" height="11" rx="5" fill="#c9a978"/><path d="M-5 -5v11M0 -5v11M5 -5v11" stroke="#7b3f21" stroke-width="2"/>`,
      },
    ]),
  );
  board.scatter(30, () => passive(random, 1.4), { gap: 3, tries: 5 });
  return board.finish();
}

/** Low-grade boards: supplies and monitor boards, brown and heavy with iron. */
export function powerBoards() {
  const random = createRandom(80);
  const boards = Array.from({ length: 9 }, (_, index) =>
    lay(powerBoard(random), {
      x: 330 + (index % 3) * 480 + random.around(0, 50),
      y: 210 + Math.floor(index / 3) * 360 + random.around(0, 40),
      turn: random.around(0, 16) + random.pick([0, 180, 90]),
      shade: random.around(-0.03, 0.06),
      lift: 'high',
    }),
  );
  return { drawing: svg`${benchTop('concrete')}${boards}`, view: 'bench', seed: 80, warmth: 0.015 };
}
