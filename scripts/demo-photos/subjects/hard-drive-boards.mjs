import { createBoard, edgeContacts, passive, screwHole } from '../shared/boards.mjs';
import { choke, crystal } from '../shared/fittings.mjs';
import { barLabel, dualChip, gridChip, padGrid, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg } from '../shared/svg.mjs';

export function driveBoard(random) {
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
    [-92, 65, 150, 92],
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
