import { passive } from '../shared/boards.mjs';
import { canCapacitor, choke, crystal, heatSink } from '../shared/fittings.mjs';
import { lineCard } from '../shared/line-card.mjs';
import { barLabel, dualChip, gridChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, box, svg } from '../shared/svg.mjs';

/** Boards out of network switches and routers. */
export function networkBoards() {
  const random = createRandom(73);
  const layouts = [
    [420, 330, 6, 'green', false],
    [1190, 300, -5, 'blue', true],
    [330, 820, -4, 'dark-green', true],
    [1080, 800, 4, 'green', false],
  ];
  const boards = layouts.map(([x, y, turn, mask, contacts]) => {
    const [width, height] = [820, 500];
    const board = lineCard(random, { width, height, mask, contacts });
    for (let index = 0; index < 8; index += 1) board.put(jack(), -width / 2 + 110 + index * 62, -height / 2 + 38);
    board.put(heatSink(104, 104, { fins: 9 }), -180, 10);
    board.put(heatSink(80, 80, { fins: 7, fill: '#2c2f31', dark: '#111' }), 40, 20);
    board.put(gridChip(74, { label: ['HB 3160', '0922'] }), 180, 0);
    for (let index = 0; index < 4; index += 1)
      board.put(dualChip(70, 30, { label: ['VM 09', '0908'], leads: 16 }), 310, -60 + index * 46);
    for (let index = 0; index < 4; index += 1)
      board.put(dualChip(58, 40, { leads: 10, label: ['LT 24', '0911'] }), -width / 2 + 140 + index * 124, -150);
    board.scatter(10, () => canCapacitor(13));
    board.scatter(18, () => random.pick([dualChip(40, 22, { leads: 8 }), crystal(26), choke(30)]));
    board.scatter(200, () => passive(random), { gap: 1.5, tries: 5 });
    const part = board.finish();
    const sticker = at(-340, 60, barLabel(90, 54, random), 90);
    return lay(
      { ...part, face: svg`${part.face}${sticker}` },
      { x, y, turn, lift: 'high', shade: random.around(-0.03, 0.05) },
    );
  });
  return { drawing: svg`${benchTop('concrete')}${boards}`, view: 'bench', seed: 73 };
}

/** A shielded network jack seen from above. */
const jack = () => ({
  width: 58,
  height: 72,
  face: svg`<rect x="-24" y="-28" width="56" height="72" opacity=".4"/>${box(56, 72, 'url(#steel-bright)', 'rx="2"')}<rect x="-28" y="-36" width="56" height="9" fill="#1a1c1d"/><rect x="-10" y="-6" width="20" height="5" fill="#858b8d"/><path d="M-22 20h44" stroke="#8d9395" stroke-width="1.5"/>`,
});
