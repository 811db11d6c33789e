import { createBoard, passive } from '../shared/boards.mjs';
import { canCapacitor, choke, heatSink, toroid, transformer } from '../shared/fittings.mjs';
import { dualChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg } from '../shared/svg.mjs';

export function powerBoard(random) {
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
