import { passive } from '../shared/boards.mjs';
import { canCapacitor, crystal, header } from '../shared/fittings.mjs';
import { lineCard } from '../shared/line-card.mjs';
import { dualChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { box, svg, times } from '../shared/svg.mjs';

/** One telecom line card, gold from edge to edge. */
export function telecomCard() {
  const random = createRandom(31);
  const [width, height] = [1240, 880];
  const board = lineCard(random, { width, height, mask: 'green', contacts: true });
  for (let index = 0; index < 4; index += 1) {
    const package_ = { width: 128, height: 128, face: goldLidPackage(118) };
    board.put(package_, -420 + index * 270, -250);
  }
  for (let row = 0; row < 3; row += 1)
    for (let index = 0; index < 8; index += 1)
      board.put(
        dualChip(106, 40, { label: ['QV 88', '8947 C2'], leads: 12, colour: 'url(#gold)' }),
        -500 + index * 142,
        -90 + row * 92,
      );
  for (let index = 0; index < 3; index += 1)
    board.put(
      quadChip(100, { label: ['QV 4400', '9102'], leads: 30, colour: 'url(#gold-bright)' }),
      -380 + index * 360,
      250,
    );
  board.put(header(32, 3, { pitch: 11, fill: '#cfc9b6' }), 380, -390);
  board.scatter(30, () =>
    random.pick([dualChip(56, 26, { label: ['QV 21', '8951'], leads: 8 }), crystal(34), canCapacitor(13)]),
  );
  board.scatter(260, () => passive(random, 1.3), { gap: 2, tries: 5 });
  const card = lay(board.finish(), { x: 800, y: 590, turn: -3, lift: 'high' });
  const rule = lay(ruler({ lengthMm: 250, pixelsPerMm: 4.2, steel: true }), { x: 800, y: 1110, turn: -2.2 });
  return { drawing: svg`${benchTop('darkSteel')}${card}${rule}`, view: 'overhead', seed: 31 };
}

/** A pale ceramic package under a gold lid. */
const goldLidPackage = (size) =>
  svg`<rect x="${-size / 2 + 4}" y="${-size / 2 + 7}" width="${size}" height="${size}" opacity=".4"/>${box(size, size, 'url(#ceramic-violet)')}${box(size * 0.6, size * 0.6, 'url(#gold-lid)', 'stroke="#8b6a2b" stroke-width="2"')}${times(4, (side) => svg`<g transform="rotate(${side * 90})">${times(14, (index) => svg`<rect x="${size * (-0.45 + index * 0.066)}" y="${-size * 0.545}" width="${size * 0.036}" height="${size * 0.07}" fill="url(#gold-bright)"/>`)}</g>`)}`;
