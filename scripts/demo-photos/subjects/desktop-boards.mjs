import { createBoard } from '../shared/boards.mjs';
import {
  canCapacitor,
  choke,
  emptyCellHolder,
  header,
  heatSink,
  portBlock,
  processorSocket,
  slot,
} from '../shared/fittings.mjs';
import { drillCorners, fillBoard } from '../shared/populate.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg } from '../shared/svg.mjs';

function desktopBoard(random, { mask, slots, framed }) {
  const [width, height] = [780, 760];
  const board = createBoard({ width, height, mask, random });
  drillCorners(board, width, height);
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
  fillBoard(board, random, { chips: 26, small: 240, label: ['RK 820', '0733'] });
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
