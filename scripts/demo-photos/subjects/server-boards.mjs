import { createBoard } from '../shared/boards.mjs';
import { canCapacitor, choke, emptyCellHolder, header, heatSink, processorSocket, slot } from '../shared/fittings.mjs';
import { gridChip } from '../shared/packages.mjs';
import { drillCorners, fillBoard } from '../shared/populate.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg } from '../shared/svg.mjs';

function serverBoard(random) {
  const [width, height] = [1180, 900];
  const board = createBoard({ width, height, mask: 'dark-green', random, thickness: 7 });
  drillCorners(board, width, height);
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
  board.put(gridChip(80, { label: ['OS 4170', '1043'] }), 250, 230);
  for (let index = 0; index < 10; index += 1) board.put(choke(34), -330 + index * 44 + (index > 4 ? 250 : 0), -350);
  board.put(header(12, 2, { pitch: 13, fill: '#e6e2d6' }), 470, 300);
  board.put(header(4, 2, { pitch: 15 }), 480, 370);
  for (let index = 0; index < 6; index += 1)
    board.put(header(4, 1, { pitch: 16, fill: '#b8452f' }), 346, 180 + index * 34);
  board.put(emptyCellHolder(32), 30, 400);
  board.scatter(26, () => canCapacitor(11));
  fillBoard(board, random, { chips: 40, small: 320, label: ['OS 31', '1043'] });
  return board.finish();
}

/** A two-socket server board on top of another. */
export function serverBoards() {
  const random = createRandom(65);
  const under = lay(serverBoard(random), { x: 960, y: 330, turn: 170, shade: -0.16, lift: 'high' });
  const upper = lay(serverBoard(random), { x: 760, y: 680, turn: -4, lift: 'high' });
  return { drawing: svg`${benchTop('concrete')}${under}${upper}`, view: 'bench', seed: 65 };
}
