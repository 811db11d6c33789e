import { createBoard, screwHole } from '../shared/boards.mjs';
import { canCapacitor, choke, header, portBlock } from '../shared/fittings.mjs';
import { dieChip, gridChip } from '../shared/packages.mjs';
import { fillBoard } from '../shared/populate.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

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
  fillBoard(board, random, { chips: 16, small: 240, label: ['KL 20', '1212'] });
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
