import { createBoard, passive, screwHole } from '../shared/boards.mjs';
import {
  canCapacitor,
  choke,
  crystal,
  emptyCellHolder,
  header,
  heatSink,
  portBlock,
  processorSocket,
  slot,
} from '../shared/fittings.mjs';
import { dieChip, dualChip, gridChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

/** Fills what is left of a board with chips and small parts. */
function fill(board, random, { chips, small, label }) {
  board.scatter(chips, () =>
    random.pick([
      () => dualChip(30, 20, { leads: 7 }),
      () => dualChip(46, 24, { leads: 10, label }),
      () => quadChip(40, { label, leads: 14 }),
      () => crystal(24),
    ])(),
  );
  board.scatter(small, () => passive(random, 1.15), { gap: 1.5, tries: 5 });
}

const corners = (board, width, height) => {
  for (const [x, y] of [
    [-1, -1],
    [1, -1],
    [-1, 1],
    [1, 1],
  ]) {
    board.print(at(x * (width / 2 - 18), y * (height / 2 - 18), screwHole(7)));
    board.reserve(x * (width / 2 - 18), y * (height / 2 - 18), 34, 34);
  }
};

function desktopBoard(random, { mask, slots, framed }) {
  const [width, height] = [780, 760];
  const board = createBoard({ width, height, mask, random });
  corners(board, width, height);
  board.put(portBlock(74, [44, 30, 30, 52, 36]), -width / 2 + 34, -190);
  board.put(processorSocket(170, { frame: framed }), -40, -205);
  for (let index = 0; index < 4; index += 1)
    board.put(slot(330, { upright: true, fill: slots[index % 2], latches: '#e3ddcb' }), 180 + index * 32, -170);
  for (let index = 0; index < 8; index += 1)
    board.put(canCapacitor(13), -190 + (index % 2) * 30, -320 + Math.floor(index / 2) * 34);
  for (let index = 0; index < 4; index += 1) board.put(choke(36), -225, -300 + index * 48);
  board.put(heatSink(92, 92), 70, 60);
  for (let index = 0; index < 5; index += 1)
    board.put(
      slot(index === 1 ? 320 : 250, { fill: index === 1 ? slots[0] : '#e2ddcd', thick: 18 }),
      index === 1 ? -150 : -180,
      30 + index * 68,
    );
  board.put(heatSink(64, 64, { fins: 6 }), 190, 150);
  board.put(emptyCellHolder(30), 90, 250);
  board.put(header(12, 2, { pitch: 10, fill: '#e6e2d6' }), 300, 60);
  board.put(header(20, 2), 250, 330);
  board.put(header(20, 2, { fill: '#2f62a0' }), 250, 290);
  for (const [x, y] of [
    [320, 180],
    [320, 225],
    [275, 200],
  ])
    board.put(header(4, 2, { pitch: 11, fill: '#b04436' }), x, y);
  board.scatter(14, () => canCapacitor(11));
  fill(board, random, { chips: 26, small: 240, label: ['RK 820', '0733'] });
  return board.finish();
}

/** Three desktop boards, overlapping. */
export function desktopBoards() {
  const random = createRandom(63);
  const boards = [
    lay(desktopBoard(random, { mask: 'lime', slots: ['#5c3c78', '#25282b'], framed: false }), {
      x: 1130,
      y: 330,
      turn: 96,
      shade: -0.1,
      lift: 'high',
    }),
    lay(desktopBoard(random, { mask: 'blue', slots: ['#d8d4c4', '#25282b'], framed: true }), {
      x: 380,
      y: 400,
      turn: -7,
      shade: -0.05,
      lift: 'high',
    }),
    lay(desktopBoard(random, { mask: 'green', slots: ['#2c4f86', '#202326'], framed: false }), {
      x: 880,
      y: 720,
      turn: 5,
      lift: 'high',
    }),
  ];
  return { drawing: svg`${benchTop('wood')}${boards}`, view: 'bench', seed: 63, warmth: 0.015 };
}

function notebookBoard(random, mask) {
  const [width, height] = [620, 430];
  const outline = 'M-310 -215H120V-150H310V90H230V215H-70V150H-200V215H-310Z';
  const board = createBoard({ width, height, mask, random, outline, thickness: 4 });
  for (const [x, y, w, h] of [
    [215, -183, 190, 64],
    [270, 152, 80, 126],
    [-135, 182, 130, 66],
  ])
    board.reserve(x, y, w, h);
  board.put(processorSocket(104, { fill: '#2a2d2f' }), -100, -70);
  board.put(dieChip(76), 60, -50);
  board.put(gridChip(62, { label: ['RK 17', '1021'] }), 70, 70);
  for (const y of [60, 90]) board.put(slot(200, { fill: '#2a2d30', thick: 20 }), -150, y);
  board.put(portBlock(48, [34, 26, 26]), -290, -110);
  board.put(portBlock(48, [26, 26]), 286, -40);
  for (const [x, y] of [
    [-285, -195],
    [100, -195],
    [290, 70],
    [-285, 195],
    [210, 195],
    [-20, 20],
  ]) {
    board.print(at(x, y, screwHole(6)));
    board.reserve(x, y, 30, 30);
  }
  fill(board, random, { chips: 20, small: 240, label: ['TS 04', '1107'] });
  return board.finish();
}

/** Notebook boards in a shallow stack. */
export function notebookBoards() {
  const random = createRandom(64);
  const masks = ['dark-green', 'blue', 'green', 'black', 'dark-green', 'blue', 'green', 'dark-green'];
  const boards = masks.map((mask, index) =>
    lay(notebookBoard(random, mask), {
      x: [330, 900, 1360, 300, 1300, 800, 420, 1100][index] + random.around(0, 20),
      y: [250, 210, 330, 640, 700, 600, 960, 960][index],
      turn: [8, -12, 84, -6, 12, 172, 5, -9][index],
      shade: -0.12 + index * 0.02,
      lift: 'mid',
    }),
  );
  return { drawing: svg`${benchTop('greyMat')}${boards}`, view: 'bench', seed: 64 };
}

function serverBoard(random) {
  const [width, height] = [1180, 900];
  const board = createBoard({ width, height, mask: 'dark-green', random, thickness: 7 });
  corners(board, width, height);
  for (const side of [-1, 1]) {
    board.put(processorSocket(190, { frame: true }), side * 210, -90);
    for (let index = 0; index < 6; index += 1)
      board.put(
        slot(380, { upright: true, fill: index % 2 ? '#23262a' : '#2d4f88', latches: '#e3ddcb' }),
        side * 210 + (index < 3 ? -230 + index * 32 : 84 + index * 26),
        -100,
      );
  }
  for (let index = 0; index < 6; index += 1)
    board.put(slot(index % 2 ? 300 : 210, { fill: '#24272a', thick: 19 }), -390, 180 + index * 42);
  board.put(heatSink(120, 120, { fins: 11 }), -60, 260);
  board.put(heatSink(80, 80), 120, 330);
  board.put(gridChip(80, { label: ['OS 5520', '1043'] }), 250, 230);
  for (let index = 0; index < 10; index += 1) board.put(choke(34), -330 + index * 44 + (index > 4 ? 250 : 0), -350);
  board.put(header(12, 2, { pitch: 13, fill: '#e6e2d6' }), 470, 300);
  board.put(header(4, 2, { pitch: 15 }), 480, 370);
  for (let index = 0; index < 6; index += 1)
    board.put(header(4, 1, { pitch: 16, fill: '#b8452f' }), 370, 180 + index * 34);
  board.put(emptyCellHolder(32), 30, 400);
  board.scatter(26, () => canCapacitor(11));
  fill(board, random, { chips: 40, small: 320, label: ['OS 31', '1043'] });
  return board.finish();
}

/** A two-socket server board on top of another. */
export function serverBoards() {
  const random = createRandom(65);
  const under = lay(serverBoard(random), { x: 960, y: 330, turn: 170, shade: -0.16, lift: 'high' });
  const upper = lay(serverBoard(random), { x: 760, y: 680, turn: -4, lift: 'high' });
  return { drawing: svg`${benchTop('concrete')}${under}${upper}`, view: 'bench', seed: 65 };
}

function consoleBoard(random, mask) {
  const [width, height] = [600, 480];
  const outline = 'M-300 -200L-250 -240H180L300 -140V240H60V190H-120V240H-300Z';
  const board = createBoard({ width, height, mask, random, outline });
  for (const [x, y, w, h] of [
    [260, -205, 110, 90],
    [-30, 218, 190, 60],
    [-280, -220, 50, 50],
  ])
    board.reserve(x, y, w, h);
  board.put(dieChip(130), -60, -40);
  board.put(dieChip(96), 130, -10);
  for (let index = 0; index < 4; index += 1)
    board.put(gridChip(46, { label: ['VM 77', '1208'] }), -170 + index * 74, -165);
  for (let index = 0; index < 4; index += 1) board.put(choke(32), -250, -130 + index * 42);
  board.put(portBlock(54, [40, 28, 28, 40]), 270, 80);
  board.put(header(16, 1), -200, 205);
  board.scatter(16, () => canCapacitor(12));
  fill(board, random, { chips: 16, small: 240, label: ['KL 20', '1212'] });
  for (let index = 0; index < 6; index += 1) board.print(at(-260 + index * 100, index % 2 ? 130 : -215, screwHole(7)));
  return board.finish();
}

/** Game console boards, laid two by two. */
export function consoleBoards() {
  const random = createRandom(66);
  const spots = [
    [380, 270, 4, 'black'],
    [1120, 250, -8, 'green'],
    [820, 560, 14, 'dark-green'],
    [360, 830, -5, 'green'],
    [1140, 880, 7, 'black'],
  ];
  const boards = spots.map(([x, y, turn, mask]) =>
    lay(consoleBoard(random, mask), { x, y, turn, lift: 'high', shade: random.around(0, 0.06) }),
  );
  return { drawing: svg`${benchTop('blueMat')}${boards}`, view: 'overhead', seed: 66 };
}
