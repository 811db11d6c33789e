import { createBoard, passive, screwHole } from '../shared/boards.mjs';
import { canCapacitor, crystal, header } from '../shared/fittings.mjs';
import { dualChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

export function playerBoard(random) {
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
