import { createBoard, screwHole } from '../shared/boards.mjs';
import { portBlock, processorSocket, slot } from '../shared/fittings.mjs';
import { dieChip, gridChip } from '../shared/packages.mjs';
import { fillBoard } from '../shared/populate.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

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
  fillBoard(board, random, { chips: 20, small: 240, label: ['TS 04', '1107'] });
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
