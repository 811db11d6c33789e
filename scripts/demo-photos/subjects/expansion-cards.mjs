import { createBoard, edgeContacts, passive } from '../shared/boards.mjs';
import { canCapacitor, choke, crystal, heatSink, portBlock } from '../shared/fittings.mjs';
import { dualChip, gridChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, box, svg } from '../shared/svg.mjs';

/** An expansion card: contacts below, a steel bracket on its left. */
export function expansionCard(random, { width, mask, label }) {
  const height = 230;
  const tongue = width * 0.62;
  const left = -width * 0.3;
  const outline = svg`M${-width / 2} ${-height / 2}H${width / 2}V${height / 2 - 34}H${left + tongue}V${height / 2}H${left}V${height / 2 - 34}H${-width / 2}Z`;
  const board = createBoard({ width, height, mask, random, outline });
  board.print(
    at(
      left + tongue / 2,
      height / 2 - 16,
      edgeContacts({ width: tongue - 8, tall: 28, pitch: 8, gaps: [[0.2, 0.26]], random }),
    ),
  );
  board.reserve(0, height / 2 - 20, width, 46);
  board.put(portBlock(40, [46, 46], { fill: 'url(#steel-bright)' }), -width / 2 + 22, -20);
  if (random.chance(0.5)) board.put(heatSink(92, 92), 10, -30);
  else board.put(quadChip(random.between(60, 84), { label, leads: 26 }), 10, -30);
  board.scatter(random.whole(4, 8), () =>
    random.pick([dualChip(52, 26, { leads: 12, label }), gridChip(40, { label })]),
  );
  board.scatter(6, () => canCapacitor(10));
  board.scatter(5, () => random.pick([dualChip(28, 18, { leads: 6 }), crystal(24), choke(24)]));
  board.scatter(110, () => passive(random), { gap: 1.5, tries: 5 });
  const part = board.finish();
  const bracket = at(
    -width / 2 - 8,
    0,
    svg`${box(15, height + 44, 'url(#steel-bright)')}<rect x="5" y="${-height / 2 - 22}" width="3" height="${height + 44}" fill="#7c8284"/>`,
  );
  return { ...part, face: svg`${part.face}${random.chance(0.6) ? bracket : ''}` };
}

/** Expansion cards spread on a mat. */
export function expansionCards() {
  const random = createRandom(71);
  const masks = [
    'green',
    'dark-green',
    'lime',
    'red',
    'green',
    'blue',
    'brown',
    'black',
    'green',
    'green',
    'dark-green',
    'blue',
    'lime',
  ];
  const labels = [
    ['VEL 40', '9827'],
    ['AR 7751', '0114'],
    ['NK 310', '0336'],
  ];
  const cards = masks.map((mask, index) =>
    lay(expansionCard(random, { width: random.between(400, 560), mask, label: random.pick(labels) }), {
      x: 290 + (index % 3) * 510 + random.around(0, 40),
      y: 150 + Math.floor(index / 3) * 238 + random.around(0, 22),
      turn: random.around(0, 10) + (index % 5 === 3 ? 180 : 0),
      shade: random.around(0, 0.06),
      lift: 'high',
    }),
  );
  return { drawing: svg`${benchTop('cardboard')}${cards}`, view: 'bench', seed: 71, warmth: 0.015 };
}
